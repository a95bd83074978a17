import type { Metadata } from 'next';
import { JobRuns } from '@/features/clubs/components/job-runs';
import { readJobs } from '@/features/clubs/read-jobs';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';

export const metadata: Metadata = { title: 'Jobs' };

export default clubPage('jobs.read', async ({ scope }) => {
  const jobs = await readJobs(scope, now());
  return (
    <>
      <PageTitle title="Jobs" over={scope.club.name} lead="What the server does by the clock, for all its clubs." />
      {jobs.length === 0 && (
        <EmptyState title="No job has run">
          Jobs run while the server is up, a few seconds after it starts. If this stays empty, they are switched off in
          its settings.
        </EmptyState>
      )}
      {jobs.map(({ name, last, failed }) => (
        <Section key={name} title={name}>
          <JobRuns caption="Last runs" runs={last} />
          {failed.length > 0 && (
            <div className="mt-4">
              <JobRuns caption="Last that failed" runs={failed} />
            </div>
          )}
        </Section>
      ))}
    </>
  );
});
