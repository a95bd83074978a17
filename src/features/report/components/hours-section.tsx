import { numberText } from '@/features/clubs/read-number';
import { ButtonLink } from '@/ui/button';
import { FigureHead, FigureTable } from '@/ui/figure-table';
import { Section } from '@/ui/page-parts';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { HoursPart, HoursRow } from '../parts/hours';
import { HOURS_WORDS as words } from '../words/hours';
import { PART_TITLES } from '../words/page';
import { CsvLink } from './csv-link';
import type { PartProps } from './part-props';

export function HoursSection({ club, report, hours }: PartProps & { hours: HoursPart }) {
  if (hours.total === 0) {
    return (
      <Section id="hours" title={PART_TITLES.hours} note={words.note}>
        <p className="mb-3 text-ink-soft">{words.empty}</p>
        <ButtonLink href={`/clubs/${club}/chores`}>{words.chores}</ButtonLink>
      </Section>
    );
  }
  return (
    <Section
      id="hours"
      title={PART_TITLES.hours}
      note={words.note}
      actions={<CsvLink club={club} report={report} part="hours" title={PART_TITLES.hours} />}
    >
      <FigureTable caption={words.caption}>
        <THead>
          <Th>{words.member}</Th>
          <Th align="right">{words.onDays}</Th>
          <Th align="right">{words.forChores}</Th>
          <Th align="right">{words.total}</Th>
        </THead>
        <TBody>
          <Line row={{ ...hours, memberId: '', name: words.all }} />
          {hours.rows.map((row) => (
            <Line key={row.memberId} row={row} />
          ))}
        </TBody>
      </FigureTable>
    </Section>
  );
}

function Line({ row }: { row: HoursRow }) {
  return (
    <Tr>
      <FigureHead>{row.name}</FigureHead>
      <Td align="right">{numberText(row.onDays)}</Td>
      <Td align="right">{numberText(row.forChores)}</Td>
      <Td align="right">{numberText(row.total)}</Td>
    </Tr>
  );
}
