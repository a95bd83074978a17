import { TextLink } from '@/ui/button';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { ImportLine } from '../imports-data';

interface ImportListProps {
  club: string;
  lines: (ImportLine & { at: string })[];
}

function stateText({ state, made }: ImportLine): string {
  if (state === 'read') return 'Waits to be looked over';
  const many = made.length === 1 ? 'One thing added' : `${made.length} things added`;
  return state === 'saved' ? many : `${many}, then undone`;
}

/** The latest files, each with a way back to it. */
export function ImportList({ club, lines }: ImportListProps) {
  return (
    <Table caption="Files read before" captionHidden>
      <THead>
        <Th>File</Th>
        <Th>Read</Th>
        <Th>By</Th>
        <Th>What came of it</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.id}>
            <RowHead>
              <TextLink href={`/clubs/${club}/ground/import/${line.id}`}>{line.fileName}</TextLink>
            </RowHead>
            <Td label="Read">{line.at}</Td>
            <Td label="By">{line.memberName}</Td>
            <Td label="What came of it">{stateText(line)}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
