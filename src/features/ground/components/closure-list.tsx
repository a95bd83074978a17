import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { ClosureLine } from '../view';
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
        <Th>Closed</Th>
        <Th>Days</Th>
        <Th>Reason</Th>
        <Th>Booked all the same</Th>
        <Th>Change</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.id}>
            <RowHead>
              {line.standName ?? 'The whole ground'} {line.now && <Badge look="clay">Now</Badge>}
            </RowHead>
            <Td label="Days">{line.days}</Td>
            <Td label="Reason">{line.reason}</Td>
            <Td label="Booked all the same">{line.touched || 'Nobody'}</Td>
            <Td label="Change">
              <OpenAgainButton
                club={club}
                id={line.id}
                what={line.standName ?? 'the whole ground'}
                openAgain={openAgain}
              />
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
