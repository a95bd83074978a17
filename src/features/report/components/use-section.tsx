import { FigureHead, FigureTable } from '@/ui/figure-table';
import { Section } from '@/ui/page-parts';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { UsePart } from '../parts/use';
import { PART_TITLES } from '../words/page';
import { USE_WORDS, WEEKS_TABLE_WORDS, USE_TABLE_WORDS as words } from '../words/use';
import { CsvLink } from './csv-link';
import type { PartProps } from './part-props';
import { UseStrips } from './use-strips';

export function UseSection({ club, report }: PartProps) {
  const { use } = report;
  return (
    <Section
      id="use"
      title={PART_TITLES.use}
      note={USE_WORDS.note}
      actions={
        <>
          <CsvLink club={club} report={report} part="use" title={USE_WORDS.sitsFile} named />
          <CsvLink club={club} report={report} part="pressure" title={USE_WORDS.pressureFile} named />
        </>
      }
    >
      <UseStrips use={use} />
      <UseTable use={use} />
      <details className="mt-4 print:hidden">
        <summary className="min-h-11 py-2 font-semibold">{WEEKS_TABLE_WORDS.open}</summary>
        <WeeksTable use={use} />
      </details>
    </Section>
  );
}

function UseTable({ use }: { use: UsePart }) {
  return (
    <FigureTable caption={words.caption}>
      <THead>
        <Th>{words.stand}</Th>
        <Th align="right">{words.sits}</Th>
        <Th align="right">{words.mornings}</Th>
        <Th align="right">{words.evenings}</Th>
        <Th align="right">{words.last}</Th>
        <Th align="right">{words.mean}</Th>
        <Th align="right">{words.peak}</Th>
      </THead>
      <TBody>
        {use.rows.map((row) => {
          const last = row.days.at(-1);
          return (
            <Tr key={row.standId}>
              <FigureHead>{row.gone ? USE_WORDS.gone(row.name) : row.name}</FigureHead>
              <Td align="right">{row.sits}</Td>
              <Td align="right">{row.mornings}</Td>
              <Td align="right">{row.evenings}</Td>
              <Td align="right">{last ? words.day(last) : words.none}</Td>
              <Td align="right">{row.meanPressure.toFixed(2)}</Td>
              <Td align="right">{row.peakDay ? words.peakOn(row.peakPressure.toFixed(2), row.peakDay) : words.none}</Td>
            </Tr>
          );
        })}
      </TBody>
    </FigureTable>
  );
}

/** Thickest line under a number, px. */
const THICKEST = 6;

function WeeksTable({ use }: { use: UsePart }) {
  const most = Math.max(1, ...use.rows.flatMap(({ byWeek }) => byWeek));
  return (
    <FigureTable caption={WEEKS_TABLE_WORDS.caption}>
      <THead>
        <Th>{WEEKS_TABLE_WORDS.stand}</Th>
        {use.weeks.map(({ fromDay }) => (
          <Th key={fromDay} align="right" className="whitespace-nowrap">
            {WEEKS_TABLE_WORDS.week(fromDay)}
          </Th>
        ))}
      </THead>
      <TBody>
        {use.rows.map((row) => (
          <Tr key={row.standId}>
            <FigureHead>{row.gone ? USE_WORDS.gone(row.name) : row.name}</FigureHead>
            {row.byWeek.map((sits, week) => (
              <Td
                key={use.weeks[week]?.fromDay}
                align="right"
                className={sits === 0 ? 'text-ink-soft' : 'border-moss font-semibold'}
                style={sits === 0 ? undefined : { borderBottomWidth: (THICKEST * sits) / most }}
              >
                {sits}
              </Td>
            ))}
          </Tr>
        ))}
      </TBody>
    </FigureTable>
  );
}
