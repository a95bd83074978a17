'use client';

import { CancelSitButton } from '@/features/bookings/components/cancel-sit-button';
import type { CancelAction } from '@/features/bookings/components/cancel-sit-dialog';
import { Badge } from '@/ui/badge';
import { Button } from '@/ui/button';
import { LazyDialog } from '@/ui/lazy-part';
import { useWaiting } from '@/ui/offline/use-waiting';
import type { WaitingItem } from '@/ui/offline/waiting-store';
import type { Board, BoardSit } from '../reads';
import { BOARD_ROW_WORDS, BOARD_BUTTON_WORDS as BUTTONS } from '../words/board';
import type { BoardActions } from './board-actions';
import { lazyMove, lazyShare, lazySignIn, lazySignOut } from './board-parts';

export interface BoardRowProps {
  club: string;
  board: Board;
  /** null: the reader only looks. */
  actions: BoardActions | null;
  /** Given to those who may cancel anybody's sit. */
  cancel: CancelAction | null;
}

type DoingsProps = BoardRowProps & { sit: BoardSit };

/** The last press for a sit that waits on this device. */
function keptSign(waiting: WaitingItem[], sitId: string): string | undefined {
  return waiting
    .filter(
      ({ refused, kind, values }) =>
        refused === null && kind.startsWith('sign_') && 'sitId' in values && values.sitId === sitId,
    )
    .at(-1)?.kind;
}

function SignOutButton({ club, sit, outingId, actions }: DoingsProps & { outingId: string | null }) {
  if (!actions) return null;
  return (
    <LazyDialog
      of={lazySignOut}
      part={{ club, sit, outingId, signOut: actions.signOut }}
      trigger={(opener) => (
        <Button {...opener} look="primary" aria-label={BUTTONS.signOutFor(sit.memberName, sit.standName)}>
          {BUTTONS.signOut}
        </Button>
      )}
    />
  );
}

function SignInButton({ club, sit, board, actions }: DoingsProps) {
  if (!actions || !sit.signIn) return null;
  return (
    <LazyDialog
      of={lazySignIn}
      part={{ club, sit, start: sit.signIn, board, signIn: actions.signIn }}
      trigger={(opener) => (
        <Button {...opener} look="primary" aria-label={BUTTONS.signInFor(sit.memberName, sit.standName)}>
          {BUTTONS.signIn}
        </Button>
      )}
    />
  );
}

/** For somebody who is out there. */
function OutingButtons(props: DoingsProps) {
  const { club, sit, actions } = props;
  const { outing } = sit;
  if (!actions || !outing || !sit.maySign) return null;
  return (
    <>
      <SignOutButton {...props} outingId={outing.id} />
      <LazyDialog
        of={lazyMove}
        part={{ club, sit, outingId: outing.id, move: actions.move }}
        trigger={(opener) => (
          <Button {...opener} aria-label={BUTTONS.moveFor(sit.memberName, sit.standName)}>
            {BUTTONS.move}
          </Button>
        )}
      />
      {(sit.mine || outing.linked) && (
        <LazyDialog
          of={lazyShare}
          part={{ club, sit, outing, actions }}
          trigger={(opener) => (
            <Button {...opener} look="quiet" aria-label={BUTTONS.shareFor(sit.memberName, sit.standName)}>
              {BUTTONS.share}
            </Button>
          )}
        />
      )}
    </>
  );
}

/** What the reader may do about a sit. */
export function Doings(props: DoingsProps) {
  const { sit, club, actions, cancel } = props;
  const open = sit.state === 'due' || sit.state === 'late';
  const kept = keptSign(useWaiting(), sit.id);
  if (kept === 'sign_out') return <Badge look="clay">{BOARD_ROW_WORDS.outNotSent}</Badge>;
  if (kept === 'sign_in' && actions) {
    return (
      <div className="flex flex-wrap items-center gap-2">
        <Badge look="clay">{BOARD_ROW_WORDS.inNotSent}</Badge>
        <SignOutButton {...props} outingId={null} />
      </div>
    );
  }
  return (
    <div className="flex flex-wrap gap-2">
      <SignInButton {...props} />
      <OutingButtons {...props} />
      {cancel && open && (
        <CancelSitButton
          club={club}
          cancel={cancel}
          sit={{ id: sit.id, standName: sit.standName, whenText: sit.windowText }}
          memberName={sit.mine ? undefined : sit.memberName}
        />
      )}
    </div>
  );
}
