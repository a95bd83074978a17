'use client';

import { type CancelAction, CancelSitDialog } from '@/features/bookings/components/cancel-sit-dialog';
import { useWaiting } from '@/ui/offline/use-offline';
import type { WaitingItem } from '@/ui/offline/waiting-store';
import { Badge, type BadgeLook } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { Board, BoardSit } from '../reads';
import type { BoardActions } from './board-actions';
import { MoveDialog } from './move-dialog';
import { ShareDialog } from './share-dialog';
import { SignInDialog } from './sign-in-dialog';
import { SignOutButton } from './sign-out-button';

export interface BoardRowProps {
  club: string;
  board: Board;
  /** null: the reader only looks. */
  actions: BoardActions | null;
  /** Given to those who may cancel anybody's sit. */
  cancel: CancelAction | null;
}

const LOOKS: Record<BoardSit['state'], BadgeLook> = {
  overdue: 'clay',
  in: 'strong',
  late: 'clay',
  due: 'plain',
  out: 'moss',
  unsigned: 'plain',
};

const wayOf = ({ wayIn, parking, vehicle }: BoardSit) =>
  [wayIn ?? 'Way not said', ...(parking ? [`parked at ${parking}`] : []), ...(vehicle ? [vehicle] : [])].join(', ');

/** The last press for a sit that waits on this device. */
function keptSign(waiting: WaitingItem[], sitId: string): string | undefined {
  return waiting
    .filter(
      ({ refused, kind, values }) =>
        refused === null && kind.startsWith('sign_') && 'sitId' in values && values.sitId === sitId,
    )
    .at(-1)?.kind;
}

function Doings({ sit, club, board, actions, cancel }: BoardRowProps & { sit: BoardSit }) {
  const { outing } = sit;
  const open = sit.state === 'due' || sit.state === 'late';
  const kept = keptSign(useWaiting(), sit.id);
  if (kept === 'sign_out') return <Badge look="clay">Signed out here, not sent yet</Badge>;
  if (kept === 'sign_in' && actions) {
    return (
      <div className="flex flex-wrap items-center gap-2">
        <Badge look="clay">Signed in here, not sent yet</Badge>
        <SignOutButton club={club} sit={sit} outingId={null} signOut={actions.signOut} />
      </div>
    );
  }
  return (
    <div className="flex flex-wrap gap-2">
      {actions && sit.signIn && (
        <SignInDialog club={club} sit={sit} start={sit.signIn} board={board} signIn={actions.signIn} />
      )}
      {actions && outing && sit.maySign && (
        <>
          <SignOutButton club={club} sit={sit} outingId={outing.id} signOut={actions.signOut} />
          <MoveDialog club={club} sit={sit} outingId={outing.id} move={actions.move} />
          {(sit.mine || outing.linked) && <ShareDialog club={club} sit={sit} outing={outing} actions={actions} />}
        </>
      )}
      {cancel && open && (
        <CancelSitDialog
          club={club}
          cancel={cancel}
          sit={{ id: sit.id, standName: sit.standName, whenText: sit.windowText }}
          memberName={sit.mine ? undefined : sit.memberName}
        />
      )}
    </div>
  );
}

function BoardRow(props: BoardRowProps & { sit: BoardSit; acts: boolean }) {
  const { sit } = props;
  return (
    <Tr>
      <RowHead>
        {sit.memberName} {sit.mine && <Badge look="moss">You</Badge>}
      </RowHead>
      <Td label="State">
        {/* One box: a stacked row lays each child of the cell in its grid. */}
        <div>
          <Badge look={LOOKS[sit.state]}>{sit.stateText}</Badge>
          {sit.backByText && <span className="block">Back by {sit.backByText}</span>}
          {sit.lastSign && <span className="block text-ink-soft text-sm">{sit.lastSign}</span>}
          {sit.told.map((line) => (
            <span key={line} className="block text-ink-soft text-sm">
              {line}
            </span>
          ))}
        </div>
      </Td>
      <Td label="Stand">{sit.standName}</Td>
      <Td label="When">
        {sit.windowText}, {sit.timeText}
      </Td>
      <Td label="Way in">{wayOf(sit)}</Td>
      <Td label="Guests">{sit.guests.length > 0 ? sit.guests.join(', ') : 'None'}</Td>
      {props.acts && (
        <Td label="Do">
          <Doings {...props} />
        </Td>
      )}
    </Tr>
  );
}

export function BoardTable({ caption, sits, ...rest }: BoardRowProps & { caption: string; sits: BoardSit[] }) {
  const acts = rest.actions !== null || rest.cancel !== null;
  return (
    <Table caption={caption} captionHidden>
      <THead>
        <Th>Who</Th>
        <Th>State</Th>
        <Th>Stand</Th>
        <Th>When</Th>
        <Th>Way in</Th>
        <Th>Guests</Th>
        {acts && <Th>Do</Th>}
      </THead>
      <TBody>
        {sits.map((sit) => (
          <BoardRow key={sit.id} sit={sit} acts={acts} {...rest} />
        ))}
      </TBody>
    </Table>
  );
}
