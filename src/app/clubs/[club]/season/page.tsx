import { PrintButton } from '@/features/board/components/print-button';
import { BumpsSection } from '@/features/report/components/bumps-section';
import { Contents } from '@/features/report/components/contents';
import { DeerSection } from '@/features/report/components/deer-section';
import { HarvestSection } from '@/features/report/components/harvest-section';
import { Headline } from '@/features/report/components/headline';
import { HoursSection } from '@/features/report/components/hours-section';
import { MembersSection } from '@/features/report/components/members-section';
import { PeriodForm } from '@/features/report/components/period-form';
import { RestsSection } from '@/features/report/components/rests-section';
import { UnusedSection } from '@/features/report/components/unused-section';
import { UseSection } from '@/features/report/components/use-section';
import { readReport } from '@/features/report/reads';
import { readReportAsk } from '@/features/report/report-schema';
import { HEADLINE_WORDS, REPORT_PAGE_WORDS as words } from '@/features/report/words/page';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';

export const metadata = { title: words.title };

export default clubPage('report.read', async ({ scope, search }) => {
  const { slug, name, rules } = scope.club;
  const report = await readReport(scope, readReportAsk(search), now());
  const { period, choices, harvest, hours, kept } = report;
  const part = { club: slug, report };
  return (
    <>
      <PageTitle over={name} title={words.titleOf(period.label)} lead={words.lead} actions={<PrintButton />} />
      <PeriodForm page={`/clubs/${slug}/season`} period={period} choices={choices} />
      {period.problem && <Notice title={period.problem} className="mb-6" />}
      {report.sits === 0 ? (
        <EmptyState title={words.emptyTitle} action={<ButtonLink href={`/clubs/${slug}/sit`}>{words.book}</ButtonLink>}>
          {words.emptyText}
        </EmptyState>
      ) : (
        <>
          <Section title={HEADLINE_WORDS.title}>
            <Headline report={report} />
            <Contents
              parts={[
                'use',
                'rests',
                'unused',
                'members',
                'bumps',
                'deer',
                ...(harvest ? (['harvest'] as const) : []),
                ...(hours ? (['hours'] as const) : []),
              ]}
            />
          </Section>
          {kept && (
            <Notice title={words.keptTitle} className="mt-6">
              {rules.sightingsSeenBy === 'officers' ? words.keptForOfficers : words.keptUntilOver}
            </Notice>
          )}
          <UseSection {...part} />
          <RestsSection {...part} />
          <UnusedSection {...part} />
          <MembersSection {...part} />
          <BumpsSection {...part} />
          <DeerSection {...part} />
        </>
      )}
      {harvest && <HarvestSection {...part} harvest={harvest} maySetQuotas={scope.can('rules.write')} />}
      {hours && <HoursSection {...part} hours={hours} />}
    </>
  );
});
