import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { HistoryLine } from '../reads';
import { LOG_HISTORY_WORDS } from '../words/screen';

const words = LOG_HISTORY_WORDS;

/** What the log says and said before, the latest first. */
export function LogHistory({ lines }: { lines: HistoryLine[] }) {
  return (
    <Table caption={words.caption} captionHidden>
      <THead>
        <Th>{words.savedBy}</Th>
        <Th>{words.hours}</Th>
        <Th>{words.deer}</Th>
        <Th>{words.bumped}</Th>
        <Th>{words.shot}</Th>
        <Th>{words.notes}</Th>
      </THead>
      <TBody>
        {lines.map(({ version, savedText, line }) => (
          <Tr key={version}>
            <RowHead>{savedText}</RowHead>
            <Td label={words.hours}>{line.timeText}</Td>
            <Td label={words.deer}>{line.counts}</Td>
            <Td label={words.bumped}>{line.bumps || words.none}</Td>
            <Td label={words.shot}>{line.shot || words.none}</Td>
            <Td label={words.notes}>{line.notes || '–'}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
