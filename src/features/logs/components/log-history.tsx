import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { HistoryLine } from '../reads';

/** What the log says and said before, the latest first. */
export function LogHistory({ lines }: { lines: HistoryLine[] }) {
  return (
    <Table caption="Each time the log was saved, the latest first" captionHidden>
      <THead>
        <Th>Saved by</Th>
        <Th>Hours</Th>
        <Th>Deer</Th>
        <Th>Bumped</Th>
        <Th>Shot</Th>
        <Th>Notes</Th>
      </THead>
      <TBody>
        {lines.map(({ version, savedText, line }) => (
          <Tr key={version}>
            <RowHead>{savedText}</RowHead>
            <Td label="Hours">{line.timeText}</Td>
            <Td label="Deer">{line.counts}</Td>
            <Td label="Bumped">{line.bumps || 'None'}</Td>
            <Td label="Shot">{line.shot || 'None'}</Td>
            <Td label="Notes">{line.notes || '–'}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
