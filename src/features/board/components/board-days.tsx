'use client';

import { useQuery } from '@tanstack/react-query';
import { type CancelAction, CancelSitDialog } from '@/features/bookings/components/cancel-sit-dialog';
import { EmptyState, Notice } from '@/ui/notices';
import { Badge, Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { boardQuery } from '../queries';
import type { Board, BoardDay, BoardSit, SitPhase } from '../reads';

interface BoardDaysProps {
  club: string;
  initial: Board;
  /** Given to those who may cancel anybody's sit. */
  cancel: CancelAction | null;
}

const PHASES: Record<SitPhase, string> = { to_come: 'To come', now: 'Window open now', over: 'Window over' };

function way({ wayIn, parking }: BoardSit): string {
  if (wayIn === null) return 'Not said';
  return parking === null ? wayIn : `${wayIn}, parked at ${parking}`;
}

function DayTable({ club, day, cancel }: { club: string; day: BoardDay; cancel: CancelAction | null }) {
  return (
    <Table caption={`Sits booked for ${day.dayText}`} captionHidden>
      <THead>
        <Th>Who</Th>
        <Th>Stand</Th>
        <Th>When</Th>
        <Th>Way in</Th>
        <Th>Guests</Th>
        {cancel && <Th>Officer</Th>}
      </THead>
      <TBody>
        {day.sits.map((sit) => (
          <Tr key={sit.id}>
            <RowHead>
              {sit.memberName} {sit.mine && <Badge look="moss">You</Badge>}
            </RowHead>
            <Td label="Stand">{sit.standName}</Td>
            <Td label="When">
              {/* One box: a stacked row lays each child of the cell in its grid. */}
              <div>
                {sit.windowText}, {sit.timeText}
                <span className="block text-ink-soft text-sm">{PHASES[sit.phase]}</span>
              </div>
            </Td>
            <Td label="Way in">{way(sit)}</Td>
            <Td label="Guests">{sit.guests.length > 0 ? sit.guests.join(', ') : 'None'}</Td>
            {cancel && (
              <Td label="Officer">
                {sit.phase === 'over' ? (
                  'On record'
                ) : (
                  <CancelSitDialog
                    club={club}
                    cancel={cancel}
                    sit={{ id: sit.id, standName: sit.standName, whenText: `${day.dayText}, ${sit.windowText}` }}
                    memberName={sit.mine ? undefined : sit.memberName}
                  />
                )}
              </Td>
            )}
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}

export function BoardDays({ club, initial, cancel }: BoardDaysProps) {
  const { data, error } = useQuery({ ...boardQuery(club), initialData: initial });
  return (
    <>
      {error && (
        <Notice level="caution" live title="This may be old" className="mb-6">
          {error.message}
        </Notice>
      )}
      {data.days.map((day) => (
        <Section key={day.day} title={`${day.title}, ${day.dayText}`}>
          {day.sits.length === 0 ? (
            <EmptyState title="Nobody is booked">Sits show here as soon as they are booked.</EmptyState>
          ) : (
            <DayTable club={club} day={day} cancel={cancel} />
          )}
        </Section>
      ))}
    </>
  );
}
