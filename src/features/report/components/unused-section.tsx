import { Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { PART_TITLES } from '../words/page';
import { UNUSED_WORDS as words } from '../words/rests';
import { CsvLink } from './csv-link';
import type { PartProps } from './part-props';

export function UnusedSection({ club, report }: PartProps) {
  const { unused } = report;
  const hasMore = unused.some(({ closedDays, drawnOn }) => closedDays > 0 || drawnOn !== null);
  if (unused.length === 0) {
    return (
      <Section id="unused" title={PART_TITLES.unused} note={words.note}>
        <p>{words.none}</p>
      </Section>
    );
  }
  return (
    <Section
      id="unused"
      title={PART_TITLES.unused}
      note={words.note}
      actions={<CsvLink club={club} report={report} part="unused" title={PART_TITLES.unused} />}
    >
      <Table caption={words.caption} captionHidden>
        <THead>
          <Th>{words.stand}</Th>
          <Th>{words.what}</Th>
          <Th>{words.last}</Th>
          {hasMore && <Th>{words.why}</Th>}
        </THead>
        <TBody>
          {unused.map((line) => (
            <Tr key={line.standId}>
              <RowHead>{line.name}</RowHead>
              <Td label={words.what}>{words.whatOf(line.what, line.sits)}</Td>
              <Td label={words.last}>{line.lastDay ? words.lastOf(line.lastDay) : words.noSit}</Td>
              {hasMore && (
                <Td label={words.why}>
                  <span>
                    {line.closedDays > 0 && words.closed(line.closedDays)} {line.drawnOn && words.drawn(line.drawnOn)}
                  </span>
                </Td>
              )}
            </Tr>
          ))}
        </TBody>
      </Table>
    </Section>
  );
}
