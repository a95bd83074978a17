import type { Metadata } from 'next';
import { BoardDays } from '@/features/board/components/board-days';
import { readBoard } from '@/features/board/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { cancelSitAction } from '../sit/actions';

export const metadata: Metadata = { title: 'Board' };

export default clubPage('board.read', async ({ scope }) => {
  const { slug, name } = scope.club;
  return (
    <>
      <PageTitle
        over={name}
        title="Board"
        lead="Who is booked where, today and tomorrow, by the club's clock."
        actions={scope.can('sits.book') && <ButtonLink href={`/clubs/${slug}/my-sits`}>My sits</ButtonLink>}
      />
      <Notice level="caution" title="Windrest is no rescue service" className="mb-8">
        The board shows what was booked, not who is safely home. Tell someone where you sit and when you will be back,
        and call the emergency number when somebody is missing.
      </Notice>
      <BoardDays
        club={slug}
        initial={await readBoard(scope, now())}
        cancel={scope.can('sits.cancel_any') ? cancelSitAction : null}
      />
    </>
  );
});
