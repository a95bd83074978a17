import { FigureHead, FigureTable } from '@/ui/figure-table';
import { Section } from '@/ui/page-parts';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';
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
      <FigureTable caption={words.caption}>
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
              <FigureHead>{row.name}</FigureHead>
              <Td align="right">{words.ruleOf(row.restDays)}</Td>
              <Td align="right">{row.times}</Td>
              <Td align="right">
                <span className={row.kept < row.times ? 'font-semibold' : undefined}>
                  {words.keptOf(row.kept, row.times)}
                </span>
              </Td>
              <Td align="right">{row.least === null ? words.never : words.leastOf(row.least)}</Td>
            </Tr>
          ))}
        </TBody>
      </FigureTable>
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
