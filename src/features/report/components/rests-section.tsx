import { Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { PART_TITLES } from '../words/page';
import { RESTS_WORDS as words } from '../words/rests';
import { CsvLink } from './csv-link';
import type { PartProps } from './part-props';

export function RestsSection({ club, report }: PartProps) {
  const { rests } = report;
  if (rests.times === 0) {
    return (
      <Section id="rests" title={PART_TITLES.rests} note={words.note}>
        <p className="text-ink-soft">{words.empty}</p>
      </Section>
    );
  }
  return (
    <Section
      id="rests"
      title={PART_TITLES.rests}
      note={words.note}
      actions={<CsvLink club={club} report={report} part="rests" title={PART_TITLES.rests} />}
    >
      <Table caption={words.caption}>
        <THead>
          <Th>{words.stand}</Th>
          <Th align="right">{words.rule}</Th>
          <Th align="right">{words.again}</Th>
          <Th align="right">{words.kept}</Th>
          <Th align="right">{words.least}</Th>
        </THead>
        <TBody>
          {rests.rows.map((row) => (
            <Tr key={row.standId}>
              <RowHead>{row.name}</RowHead>
              <Td label={words.rule} align="right">
                {words.ruleOf(row.restDays)}
              </Td>
              <Td label={words.again} align="right">
                {row.times}
              </Td>
              <Td label={words.kept} align="right">
                <span className={row.kept < row.times ? 'font-semibold' : undefined}>
                  {words.keptOf(row.kept, row.times)}
                </span>
              </Td>
              <Td label={words.least} align="right">
                {row.least === null ? words.never : words.leastOf(row.least)}
              </Td>
            </Tr>
          ))}
        </TBody>
      </Table>
      <h3 className="mt-5 mb-1 font-serif text-lg">{words.broken}</h3>
      {rests.broken.length === 0 ? (
        <p>{words.allKept}</p>
      ) : (
        <ul className="divide-y divide-rule">
          {rests.broken.map((rest) => (
            <li key={`${rest.standId} ${rest.day}`} className="break-inside-avoid py-2">
              <span className="font-semibold">{words.line(rest.name, rest.day, rest.rested, rest.after)}</span>
              {rest.who !== null && rest.how !== null && (
                <span className="block text-ink-soft text-sm">{words.who(rest.who, rest.how)}</span>
              )}
            </li>
          ))}
        </ul>
      )}
    </Section>
  );
}
