import type { Metadata } from 'next';
import { JobRuns } from '@/features/clubs/components/job-runs';
import { readJobs } from '@/features/clubs/read-jobs';
import { JOB_TITLES } from '@/features/clubs/words/jobs';
import { CLUB_JOBS_PAGE_WORDS } from '@/features/clubs/words/pages';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';

export const metadata: Metadata = { title: CLUB_JOBS_PAGE_WORDS.title };

export default clubPage('jobs.read', async ({ scope }) => {
  const jobs = await readJobs(scope, now());
  return (
    <>
      <PageTitle title={CLUB_JOBS_PAGE_WORDS.title} over={scope.club.name} lead={CLUB_JOBS_PAGE_WORDS.lead} />
      {jobs.length === 0 && <EmptyState title={CLUB_JOBS_PAGE_WORDS.none}>{CLUB_JOBS_PAGE_WORDS.noneText}</EmptyState>}
      {jobs.map(({ name, last, failed }) => (
        <Section key={name} title={JOB_TITLES[name] ?? name}>
          <JobRuns caption={CLUB_JOBS_PAGE_WORDS.lastRuns} runs={last} />
          {failed.length > 0 && (
            <div className="mt-4">
              <JobRuns caption={CLUB_JOBS_PAGE_WORDS.lastFailed} runs={failed} />
            </div>
          )}
        </Section>
      ))}
    </>
  );
});
