import { figureText } from '@/core/indices';
import { IndexTable } from '@/features/logs/components/index-table';
import type { IndexGroup } from '@/features/logs/sightings-reads';
import { ButtonLink } from '@/ui/button';
import { RangeChart } from '@/ui/charts/range-chart';
import { Section } from '@/ui/page-parts';
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
      <IndexTable caption={words.byStandCaption} head={words.stand} groups={byStand} />
      <h3 className="mt-6 mb-2 font-serif text-lg">{words.byMonth}</h3>
      <RangeChart title={words.byMonthChart} unit={words.unit} rows={rowsOf(byMonth)} className="mb-4" />
      <IndexTable caption={words.byMonthCaption} head={words.month} groups={byMonth} />
    </Section>
  );
}
