import { TextLink } from '@/ui/button';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { ImportLine } from '../imports-data';
import { IMPORT_LIST_WORDS } from '../words/import';

const words = IMPORT_LIST_WORDS;

interface ImportListProps {
  club: string;
  lines: (ImportLine & { at: string })[];
}

function stateText({ state, made }: ImportLine): string {
  return state === 'read' ? words.waits : words[state](made.length);
}

/** The latest files, each with a way back to it. */
export function ImportList({ club, lines }: ImportListProps) {
  return (
    <Table caption={words.caption} captionHidden>
      <THead>
        <Th>{words.file}</Th>
        <Th>{words.read}</Th>
        <Th>{words.by}</Th>
        <Th>{words.outcome}</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.id}>
            <RowHead>
              <TextLink href={`/clubs/${club}/ground/import/${line.id}`}>{line.fileName}</TextLink>
            </RowHead>
            <Td label={words.read}>{line.at}</Td>
            <Td label={words.by}>{line.memberName}</Td>
            <Td label={words.outcome}>{stateText(line)}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
