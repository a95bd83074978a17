import { formatDay } from '@/core/day-time';
import { MemberCounts, QuotaTable } from '@/features/harvest/components/quota-table';
import { SheetsTable } from '@/features/harvest/components/sheets-table';
import { WeightsTable } from '@/features/harvest/components/weights-table';
import { readHarvest } from '@/features/harvest/reads';
import { HARVEST_PAGE_WORDS } from '@/features/harvest/words/season';
import { readSightingsAsk } from '@/features/logs/sightings-schema';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { Button, ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { Select } from '@/ui/text-inputs';

const words = HARVEST_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('harvest.read', async ({ scope, search }) => {
  const { slug, name, rules, units } = scope.club;
  const { year: asked } = readSightingsAsk(search);
  const { year, years, quotas, members, summary, sheets } = await readHarvest(scope, { year: asked }, now());
  const page = `/clubs/${slug}/season/harvest`;
  const state = rules.stateHarvestRule;
  const write = scope.can('harvest.write') && (
    <ButtonLink look="primary" href={`${page}/new`}>
      {words.write}
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        over={name}
        title={words.titleOf(year.label)}
        actions={
          <>
            {write}
            {sheets.length > 0 && (
              <ButtonLink href={`/api/clubs/${slug}/harvest?year=${year.year}`}>{words.csv}</ButtonLink>
            )}
          </>
        }
      />
      <form method="get" action={page} className="mb-6 flex flex-wrap items-end gap-4">
        <Select
          label={words.season}
          name="year"
          defaultValue={String(year.year)}
          options={years.map((one) => ({ value: String(one.year), label: one.label }))}
        />
        <Button type="submit">{words.show}</Button>
      </form>
      <Section title={words.quotas} note={words.quotasNote}>
        {quotas.length === 0 ? (
          <EmptyState
            title={words.noQuota}
            action={
              scope.can('rules.write') && (
                <ButtonLink href={`/clubs/${slug}/club/rules/edit`}>{words.setQuotas}</ButtonLink>
              )
            }
          >
            {words.noQuotaText}
          </EmptyState>
        ) : (
          <QuotaTable quotas={quotas} />
        )}
        <Notice title={words.law} className="mt-4">
          {state === null ? (
            <p>{words.noLaw}</p>
          ) : (
            <>
              <p className="whitespace-pre-line">{state.text}</p>
              <p className="mt-1 text-ink-soft text-sm">
                {words.lawSource(state.source, formatDay(state.statedOn, true))}
              </p>
            </>
          )}
        </Notice>
      </Section>
      {sheets.length === 0 ? (
        <Section title={words.sheets}>
          <EmptyState title={words.noSheet} action={write}>
            {words.noSheetText}
          </EmptyState>
        </Section>
      ) : (
        <>
          <Section title={words.byMember}>
            <MemberCounts members={members} />
          </Section>
          <Section title={words.bySexAndAge} note={words.bySexAndAgeNote}>
            <WeightsTable summary={summary} units={units} />
          </Section>
          <Section title={words.sheets}>
            <SheetsTable club={slug} sheets={sheets} />
          </Section>
        </>
      )}
    </>
  );
});
