import { type Figure, figureText } from '@/core/indices';
import { AllLogs } from '@/features/logs/components/all-logs';
import { IndexTable } from '@/features/logs/components/index-table';
import { SeasonFigures } from '@/features/logs/components/season-figures';
import { type IndexGroup, readSightings } from '@/features/logs/sightings-reads';
import { readSightingsAsk } from '@/features/logs/sightings-schema';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { Button, ButtonLink } from '@/ui/button';
import { RangeChart } from '@/ui/charts/range-chart';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { Select } from '@/ui/text-inputs';

export const metadata = { title: 'Sightings' };

function rows(groups: IndexGroup[], of: (group: IndexGroup) => Figure) {
  return groups.map((group) => {
    const figure = of(group);
    const { key, label, indices } = group;
    const note = `${indices.hours.toFixed(0)} h`;
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
    ...(kept ? [] : [{ value: 'club', label: 'The whole club' }]),
    { value: 'own', label: 'Mine and my guests’' },
  ];
  return (
    <>
      <PageTitle
        over={name}
        title={`Sightings ${year.label}`}
        lead="What members count from their stands. An index to compare stands and years by, not a census."
        actions={
          total.sits > 0 && (
            <>
              <ButtonLink href={file('tables')} prefetch={false}>
                Tables as CSV
              </ButtonLink>
              <ButtonLink href={file('logs')} prefetch={false}>
                Logs as CSV
              </ButtonLink>
            </>
          )
        }
      />
      <form method="get" action={page} className="mb-6 flex flex-wrap items-end gap-4">
        <Select
          label="Season"
          name="year"
          defaultValue={String(year.year)}
          options={years.map((one) => ({ value: String(one.year), label: one.label }))}
        />
        <Select label="Whose sits" name="whose" defaultValue={whose} options={whoseOptions} />
        <Button type="submit">Show</Button>
      </form>
      {kept && (
        <Notice title="Only your own sits are counted here" className="mb-6">
          The club keeps sightings{' '}
          {scope.club.rules.sightingsSeenBy === 'officers' ? 'for its officers' : 'until the season is over'}.
        </Notice>
      )}
      {total.sits === 0 ? (
        <EmptyState
          title="No log yet"
          action={scope.can('log.write') && <ButtonLink href={`/clubs/${slug}/log`}>Write a log</ButtonLink>}
        >
          Once sits have logs, deer an hour are worked out here by stand, window and month.
        </EmptyState>
      ) : (
        <>
          <Section
            title="The season so far"
            note="Sums over sums: deer over hours sat, sits without a deer too. In brackets the 95 % interval, as if each deer came alone; deer come in groups, so the truth is less sure."
          >
            <SeasonFigures indices={total} unlogged={view.unlogged} />
          </Section>
          <Section title="By stand">
            <RangeChart
              title="Deer an hour by stand."
              unit="deer an hour"
              rows={rows(view.byStand, deerPerHour)}
              className="mb-6"
            />
            <IndexTable caption="Figures by stand, the most deer an hour first" head="Stand" groups={view.byStand} />
          </Section>
          <Section title="By window">
            <IndexTable caption="Figures by window of the day" head="Window" groups={view.byWindow} />
          </Section>
          <Section title="By month">
            <RangeChart
              title="Deer an hour by month."
              unit="deer an hour"
              rows={rows(view.byMonth, deerPerHour)}
              className="mb-6"
            />
            <IndexTable caption="Figures by month" head="Month" groups={view.byMonth} />
          </Section>
          <Section title="Logs">
            <AllLogs logs={view.logs} />
          </Section>
        </>
      )}
    </>
  );
});
