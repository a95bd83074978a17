import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { ClosureLine } from '../view';
import { CLOSURE_LIST_WORDS, WHOLE_GROUND } from '../words/closures';
import type { ClubCall } from './form-types';
import { OpenAgainButton } from './open-again-button';

export interface ClosureListProps {
  club: string;
  caption: string;
  lines: ClosureLine[];
  openAgain: ClubCall<{ id: string }, { id: string }>;
}

export function ClosureList({ club, caption, lines, openAgain }: ClosureListProps) {
  return (
    <Table caption={caption} captionHidden>
      <THead>
        <Th>{CLOSURE_LIST_WORDS.closed}</Th>
        <Th>{CLOSURE_LIST_WORDS.days}</Th>
        <Th>{CLOSURE_LIST_WORDS.reason}</Th>
        <Th>{CLOSURE_LIST_WORDS.booked}</Th>
        <Th>{CLOSURE_LIST_WORDS.change}</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.id}>
            <RowHead>
              {line.standName ?? CLOSURE_LIST_WORDS.theWholeGround}{' '}
              {line.now && <Badge look="clay">{CLOSURE_LIST_WORDS.now}</Badge>}
            </RowHead>
            <Td label={CLOSURE_LIST_WORDS.days}>{line.days}</Td>
            <Td label={CLOSURE_LIST_WORDS.reason}>{line.reason}</Td>
            <Td label={CLOSURE_LIST_WORDS.booked}>{line.touched || CLOSURE_LIST_WORDS.nobody}</Td>
            <Td label={CLOSURE_LIST_WORDS.change}>
              <OpenAgainButton club={club} id={line.id} what={line.standName ?? WHOLE_GROUND} openAgain={openAgain} />
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
