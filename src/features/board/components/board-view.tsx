'use client';

import type { CancelAction } from '@/features/bookings/components/cancel-sit-dialog';
import { Button } from '@/ui/button';
import { LazyDialog } from '@/ui/lazy-part';
import { EmptyState, Notice } from '@/ui/notices';
import { Section } from '@/ui/page-parts';
import { useWatched } from '@/ui/use-watched';
import type { Board } from '../reads';
import { BOARD_BUTTON_WORDS, BOARD_WORDS } from '../words/board';
import type { BoardActions } from './board-actions';
import { lazyWalkUp } from './board-parts';
import { BoardTable } from './board-table';

interface BoardViewProps {
  club: string;
  initial: Board;
  actions: BoardActions | null;
  cancel: CancelAction | null;
}

/** The board, kept fresh while it is open. */
export function BoardView({ club, initial, actions, cancel }: BoardViewProps) {
  const load = () => import('../watch-board').then((parts) => parts.watchBoard(club));
  const { data: board, error } = useWatched<Board>(load, initial);
  const overdue = board.onGround.filter((sit) => sit.state === 'overdue');
  const row = { club, board, actions, cancel };
  return (
    <>
      {error && (
        <Notice level="caution" live title={BOARD_WORDS.old} className="mb-6">
          {error.message}
        </Notice>
      )}
      {overdue.length > 0 && (
        <Notice
          level="stop"
          live
          title={BOARD_WORDS.overdueTitle(overdue.map((sit) => sit.memberName))}
          className="mb-6"
        >
          {BOARD_WORDS.overdue}
        </Notice>
      )}
      <Section
        title={BOARD_WORDS.onGround}
        actions={
          actions &&
          board.walkUp && (
            <LazyDialog
              of={lazyWalkUp}
              part={{ club, board, walkUp: actions.walkUp, windowText: board.walkUp }}
              trigger={(opener) => <Button {...opener}>{BOARD_BUTTON_WORDS.walkUp}</Button>}
            />
          )
        }
      >
        {board.onGround.length === 0 ? (
          <EmptyState title={BOARD_WORDS.nobodyInTitle}>{BOARD_WORDS.nobodyIn}</EmptyState>
        ) : (
          <BoardTable {...row} caption={BOARD_WORDS.inCaption} sits={board.onGround} />
        )}
      </Section>
      {board.days.map((day) => (
        <Section key={day.day} title={BOARD_WORDS.dayTitle(day.title, day.dayText)}>
          {day.sits.length === 0 ? (
            <EmptyState
              title={
                board.onGround.some((sit) => sit.day === day.day) ? BOARD_WORDS.nobodyElse : BOARD_WORDS.nobodyBooked
              }
            >
              {BOARD_WORDS.showSoon}
            </EmptyState>
          ) : (
            <BoardTable {...row} caption={BOARD_WORDS.dayCaption(day.dayText)} sits={day.sits} />
          )}
        </Section>
      ))}
    </>
  );
}
