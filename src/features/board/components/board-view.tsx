'use client';

import { useQuery } from '@tanstack/react-query';
import type { CancelAction } from '@/features/bookings/components/cancel-sit-dialog';
import { EmptyState, Notice } from '@/ui/notices';
import { Section } from '@/ui/page-parts';
import { boardQuery } from '../queries';
import type { Board } from '../reads';
import type { BoardActions } from './board-actions';
import { BoardTable } from './board-table';
import { WalkUpDialog } from './walk-up-dialog';

interface BoardViewProps {
  club: string;
  initial: Board;
  actions: BoardActions | null;
  cancel: CancelAction | null;
}

function overdueWords(names: string[]): string {
  return names.length === 1 ? `${names[0]} is overdue` : `${names.length} people are overdue`;
}

/** The board, kept fresh while it is open. */
export function BoardView({ club, initial, actions, cancel }: BoardViewProps) {
  const { data: board, error } = useQuery({ ...boardQuery(club), initialData: initial });
  const overdue = board.onGround.filter((sit) => sit.state === 'overdue');
  const row = { club, board, actions, cancel };
  return (
    <>
      {error && (
        <Notice level="caution" live title="This may be old" className="mb-6">
          {error.message}
        </Notice>
      )}
      {overdue.length > 0 && (
        <Notice level="stop" live title={overdueWords(overdue.map((sit) => sit.memberName))} className="mb-6">
          Call first: most often a sign-out was forgotten. Then look for the vehicle where it was parked. When somebody
          may be hurt, call the emergency number.
        </Notice>
      )}
      <Section
        title="On the ground now"
        actions={
          actions &&
          board.walkUp && <WalkUpDialog club={club} board={board} walkUp={actions.walkUp} windowText={board.walkUp} />
        }
      >
        {board.onGround.length === 0 ? (
          <EmptyState title="Nobody is signed in">Whoever signs in stands here until they sign out.</EmptyState>
        ) : (
          <BoardTable {...row} caption="Who is signed in now" sits={board.onGround} />
        )}
      </Section>
      {board.days.map((day) => (
        <Section key={day.day} title={`${day.title}, ${day.dayText}`}>
          {day.sits.length === 0 ? (
            <EmptyState title={board.onGround.some((sit) => sit.day === day.day) ? 'Nobody else' : 'Nobody is booked'}>
              Sits show here as soon as they are booked.
            </EmptyState>
          ) : (
            <BoardTable {...row} caption={`Sits of ${day.dayText}`} sits={day.sits} />
          )}
        </Section>
      ))}
    </>
  );
}
