import type { Metadata } from 'next';
import { BoardView } from '@/features/board/components/board-view';
import { readBoard } from '@/features/board/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { cancelSitAction } from '../sit/actions';
import {
  moveBackByAction,
  revokeSitLinksAction,
  shareSitAction,
  signInSitAction,
  signOutSitAction,
  walkUpAction,
} from './actions';

export const metadata: Metadata = { title: 'Board' };

const ACTIONS = {
  signIn: signInSitAction,
  signOut: signOutSitAction,
  move: moveBackByAction,
  walkUp: walkUpAction,
  share: shareSitAction,
  revoke: revokeSitLinksAction,
};

export default clubPage('board.read', async ({ scope }) => {
  const { slug, name } = scope.club;
  return (
    <>
      <PageTitle
        over={name}
        title="Board"
        lead="Who is on the ground, and who is booked where today and tomorrow, by the club's clock."
        actions={
          <>
            {scope.can('sits.book') && <ButtonLink href={`/clubs/${slug}/my-sits`}>My sits</ButtonLink>}
            <ButtonLink look="quiet" href={`/clubs/${slug}/board/gate-sheet`}>
              Gate sheet
            </ButtonLink>
          </>
        }
      />
      <Notice level="caution" title="Windrest is no rescue service" className="mb-6">
        It mails those the club and the member have named, and sends nobody. When somebody is missing, call the
        emergency number.
      </Notice>
      <BoardView
        club={slug}
        initial={await readBoard(scope, now())}
        actions={scope.can('sits.book') ? ACTIONS : null}
        cancel={scope.can('sits.cancel_any') ? cancelSitAction : null}
      />
    </>
  );
});
