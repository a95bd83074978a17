import type { Metadata } from 'next';
import { BoardView } from '@/features/board/components/board-view';
import { readBoard } from '@/features/board/reads';
import { BOARD_PAGE_WORDS as WORDS } from '@/features/board/words/board';
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

export const metadata: Metadata = { title: WORDS.title };

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
        title={WORDS.title}
        lead={WORDS.lead}
        actions={
          <>
            {scope.can('sits.book') && <ButtonLink href={`/clubs/${slug}/my-sits`}>{WORDS.mySits}</ButtonLink>}
            <ButtonLink look="quiet" href={`/clubs/${slug}/board/gate-sheet`}>
              {WORDS.gateSheet}
            </ButtonLink>
          </>
        }
      />
      <Notice level="caution" title={WORDS.noRescueTitle} className="mb-6">
        {WORDS.noRescue}
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
