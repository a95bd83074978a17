import { type Figure, figureText } from '@/core/indices';
import { AllLogs } from '@/features/logs/components/all-logs';
import { IndexTable } from '@/features/logs/components/index-table';
import { SeasonFigures } from '@/features/logs/components/season-figures';
import { type IndexGroup, readSightings } from '@/features/logs/sightings-reads';
import { readSightingsAsk } from '@/features/logs/sightings-schema';
import { SIGHTINGS_PAGE_WORDS } from '@/features/logs/words/sightings';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { Button, ButtonLink } from '@/ui/button';
import { RangeChart } from '@/ui/charts/range-chart';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { Select } from '@/ui/text-inputs';

const words = SIGHTINGS_PAGE_WORDS;

export const metadata = { title: words.title };

function rows(groups: IndexGroup[], of: (group: IndexGroup) => Figure) {
  return groups.map((group) => {
    const figure = of(group);
    const { key, label, indices } = group;
    const note = words.hours(indices.hours);
    return { key, label, note, range: figure.known ? figure : null, text: figureText(figure) };
  });
}

const deerPerHour = ({ indices }: IndexGroup) => indices.perHour.all;

export default clubPage('log.read', async ({ scope, search }) => {
  const { slug, name } = scope.club;
  const view = await readSightings(scope, readSightingsAsk(search), now());
  const { year, years, whose, kept, total } = view;
  const page = `/clubs/${slug}/season/sightings`;
  const file = (what: string) => `/api/clubs/${slug}/sightings?year=${year.year}&whose=${whose}&what=${what}`;
  const whoseOptions = [
    ...(kept ? [] : [{ value: 'club', label: words.wholeClub }]),
    { value: 'own', label: words.own },
  ];
  return (
    <>
      <PageTitle
        over={name}
        title={words.titleOf(year.label)}
        lead={words.lead}
        actions={
          total.sits > 0 && (
            <>
              <ButtonLink href={file('tables')}>{words.tables}</ButtonLink>
              <ButtonLink href={file('logs')}>{words.logs}</ButtonLink>
            </>
          )
        }
      />
      <form method="get" action={page} className="mb-6 flex flex-wrap items-end gap-4">
        <Select
          label={words.season}
          name="year"
          defaultValue={String(year.year)}
          options={years.map((one) => ({ value: String(one.year), label: one.label }))}
        />
        <Select label={words.whose} name="whose" defaultValue={whose} options={whoseOptions} />
        <Button type="submit">{words.show}</Button>
      </form>
      {kept && (
        <Notice title={words.keptTitle} className="mb-6">
          {scope.club.rules.sightingsSeenBy === 'officers' ? words.keptForOfficers : words.keptUntilOver}
        </Notice>
      )}
      {total.sits === 0 ? (
        <EmptyState
          title={words.empty}
          action={scope.can('log.write') && <ButtonLink href={`/clubs/${slug}/log`}>{words.write}</ButtonLink>}
        >
          {words.emptyText}
        </EmptyState>
      ) : (
        <>
          <Section title={words.soFar} note={words.soFarNote}>
            <SeasonFigures indices={total} unlogged={view.unlogged} />
          </Section>
          <Section title={words.byStand}>
            <RangeChart
              title={words.byStandChart}
              unit={words.unit}
              rows={rows(view.byStand, deerPerHour)}
              className="mb-6"
            />
            <IndexTable caption={words.byStandCaption} head={words.stand} groups={view.byStand} />
          </Section>
          <Section title={words.byWindow}>
            <IndexTable caption={words.byWindowCaption} head={words.window} groups={view.byWindow} />
          </Section>
          <Section title={words.byMonth}>
            <RangeChart
              title={words.byMonthChart}
              unit={words.unit}
              rows={rows(view.byMonth, deerPerHour)}
              className="mb-6"
            />
            <IndexTable caption={words.byMonthCaption} head={words.month} groups={view.byMonth} />
          </Section>
          <Section title={words.logList}>
            <AllLogs logs={view.logs} />
          </Section>
        </>
      )}
    </>
  );
});
