import { figureText, intervalText } from '@/core/indices';
import type { IndexGroup } from '@/features/logs/sightings-reads';
import { ButtonLink, TextLink } from '@/ui/button';
import { RangeChart } from '@/ui/charts/range-chart';
import { FigureHead, FigureTable } from '@/ui/figure-table';
import { Section } from '@/ui/page-parts';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';
import { DEER_WORDS as words } from '../words/deer';
import { PART_TITLES } from '../words/page';
import { CsvLink } from './csv-link';
import type { PartProps } from './part-props';

const rowsOf = (groups: IndexGroup[]) =>
  groups.map(({ key, label, indices }) => {
    const { all } = indices.perHour;
    return { key, label, note: words.hours(indices.hours), range: all.known ? all : null, text: figureText(all) };
  });

export function DeerSection({ club, report }: PartProps) {
  const { total, byStand, byMonth, unlogged } = report.deer;
  if (total.sits === 0) {
    return (
      <Section id="deer" title={PART_TITLES.deer} note={words.note}>
        <p className="mb-3 text-ink-soft">{words.empty}</p>
        <ButtonLink href={`/clubs/${club}/log`}>{words.write}</ButtonLink>
      </Section>
    );
  }
  return (
    <Section
      id="deer"
      title={PART_TITLES.deer}
      note={words.note}
      actions={<CsvLink club={club} report={report} part="deer" title={PART_TITLES.deer} />}
    >
      {unlogged > 0 && <p className="mb-4">{words.unlogged(unlogged)}</p>}
      <h3 className="mb-2 font-serif text-lg">{words.byStand}</h3>
      <RangeChart title={words.byStandChart} unit={words.unit} rows={rowsOf(byStand)} className="mb-4" />
      <DeerTable caption={words.byStandCaption} head={words.stand} groups={byStand} />
      <h3 className="mt-6 mb-2 font-serif text-lg">{words.byMonth}</h3>
      <RangeChart title={words.byMonthChart} unit={words.unit} rows={rowsOf(byMonth)} className="mb-4" />
      <DeerTable caption={words.byMonthCaption} head={words.month} groups={byMonth} />
      <p className="mt-4 print:hidden">
        <TextLink href={`/clubs/${club}/season/sightings`}>{words.more}</TextLink>
      </p>
    </Section>
  );
}

/** Bucks, does and fawns each stand on the Sightings page and in the file. */
function DeerTable({ caption, head, groups }: { caption: string; head: string; groups: IndexGroup[] }) {
  return (
    <FigureTable caption={caption}>
      <THead>
        <Th>{head}</Th>
        <Th align="right">{words.sits}</Th>
        <Th align="right">{words.hoursSat}</Th>
        <Th align="right">{words.deer}</Th>
        <Th align="right">{words.rate}</Th>
        <Th align="right">{words.interval}</Th>
      </THead>
      <TBody>
        {groups.map(({ key, label, indices: { sits, hours, seen, perHour } }) => (
          <Tr key={key}>
            <FigureHead>{label}</FigureHead>
            <Td align="right">{sits}</Td>
            <Td align="right">{hours.toFixed(1)}</Td>
            <Td align="right">{seen.all}</Td>
            <Td align="right">{figureText(perHour.all)}</Td>
            <Td align="right">{intervalText(perHour.all)}</Td>
          </Tr>
        ))}
      </TBody>
    </FigureTable>
  );
}
