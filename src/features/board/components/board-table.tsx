'use client';

import { Badge, type BadgeLook } from '@/ui/badge';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { BoardSit } from '../reads';
import { BOARD_ROW_WORDS as WORDS } from '../words/board';
import { type BoardRowProps, Doings } from './row-doings';

const LOOKS: Record<BoardSit['state'], BadgeLook> = {
  overdue: 'clay',
  in: 'strong',
  late: 'clay',
  due: 'plain',
  out: 'moss',
  unsigned: 'plain',
};

function BoardRow(props: BoardRowProps & { sit: BoardSit; acts: boolean }) {
  const { sit } = props;
  return (
    <Tr>
      <RowHead>
        {sit.memberName} {sit.mine && <Badge look="moss">{WORDS.you}</Badge>}
      </RowHead>
      <Td label={WORDS.state}>
        {/* One box: a stacked row lays each child of the cell in its grid. */}
        <div>
          <Badge look={LOOKS[sit.state]}>{sit.stateText}</Badge>
          {sit.backByText && <span className="block">{WORDS.backBy(sit.backByText)}</span>}
          {sit.lastSign && <span className="block text-ink-soft text-sm">{sit.lastSign}</span>}
          {sit.told.map((line) => (
            <span key={line} className="block text-ink-soft text-sm">
              {line}
            </span>
          ))}
        </div>
      </Td>
      <Td label={WORDS.stand}>{sit.standName}</Td>
      <Td label={WORDS.when}>{WORDS.whenText(sit.windowText, sit.timeText)}</Td>
      <Td label={WORDS.wayIn}>{WORDS.way(sit)}</Td>
      <Td label={WORDS.guests}>{sit.guests.length > 0 ? sit.guests.join(', ') : WORDS.none}</Td>
      {props.acts && (
        <Td label={WORDS.doings}>
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
        <Th>{WORDS.who}</Th>
        <Th>{WORDS.state}</Th>
        <Th>{WORDS.stand}</Th>
        <Th>{WORDS.when}</Th>
        <Th>{WORDS.wayIn}</Th>
        <Th>{WORDS.guests}</Th>
        {acts && <Th>{WORDS.doings}</Th>}
      </THead>
      <TBody>
        {sits.map((sit) => (
          <BoardRow key={sit.id} sit={sit} acts={acts} {...rest} />
        ))}
      </TBody>
    </Table>
  );
}
