import { formatDay } from '@/core/day-time';
import { MemberCounts, QuotaTable } from '@/features/harvest/components/quota-table';
import { SheetsTable } from '@/features/harvest/components/sheets-table';
import { WeightsTable } from '@/features/harvest/components/weights-table';
import { readHarvest } from '@/features/harvest/reads';
import { readSightingsAsk } from '@/features/logs/sightings-schema';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { Button, ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { Select } from '@/ui/text-inputs';

export const metadata = { title: 'Harvest' };

export default clubPage('harvest.read', async ({ scope, search }) => {
  const { slug, name, rules, units } = scope.club;
  const { year: asked } = readSightingsAsk(search);
  const { year, years, quotas, members, summary, sheets } = await readHarvest(scope, { year: asked }, now());
  const page = `/clubs/${slug}/season/harvest`;
  const state = rules.stateHarvestRule;
  const write = scope.can('harvest.write') && (
    <ButtonLink look="primary" href={`${page}/new`}>
      Write a harvest sheet
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        over={name}
        title={`Harvest ${year.label}`}
        actions={
          <>
            {write}
            {sheets.length > 0 && (
              <ButtonLink href={`/api/clubs/${slug}/harvest?year=${year.year}`} prefetch={false}>
                Sheets as CSV
              </ButtonLink>
            )}
          </>
        }
      />
      <form method="get" action={page} className="mb-6 flex flex-wrap items-end gap-4">
        <Select
          label="Season"
          name="year"
          defaultValue={String(year.year)}
          options={years.map((one) => ({ value: String(one.year), label: one.label }))}
        />
        <Button type="submit">Show</Button>
      </form>
      <Section title="Quotas" note="The club's own. They caution before a booking and refuse nothing.">
        {quotas.length === 0 ? (
          <EmptyState
            title="The club has set no quota"
            action={
              scope.can('rules.write') && (
                <ButtonLink href={`/clubs/${slug}/club/rules/edit`}>Set quotas in the rules</ButtonLink>
              )
            }
          >
            A quota may hold for the club, for each member, or for the guests of a member.
          </EmptyState>
        ) : (
          <QuotaTable quotas={quotas} />
        )}
        <Notice title="State law decides" className="mt-4">
          {state === null ? (
            <p>The club has not written the state's rules for deer down. Look them up before you hunt.</p>
          ) : (
            <>
              <p className="whitespace-pre-line">{state.text}</p>
              <p className="mt-1 text-ink-soft text-sm">
                As the club wrote it down from {state.source} on {formatDay(state.statedOn, true)}.
              </p>
            </>
          )}
        </Notice>
      </Section>
      {sheets.length === 0 ? (
        <Section title="Sheets">
          <EmptyState title="No deer is written down for this season" action={write}>
            Each deer gets a sheet: sex, age, dressed weight, antlers or milk.
          </EmptyState>
        </Section>
      ) : (
        <>
          <Section title="By member">
            <MemberCounts members={members} />
          </Section>
          <Section title="By sex and age" note="Dressed weights only: live weights are never mixed in.">
            <WeightsTable summary={summary} units={units} />
          </Section>
          <Section title="Sheets">
            <SheetsTable club={slug} sheets={sheets} />
          </Section>
        </>
      )}
    </>
  );
});
