import { ClubLogList, LogList } from '@/features/logs/components/log-list';
import { VisitList } from '@/features/logs/components/visit-list';
import { WaitingList } from '@/features/logs/components/waiting-list';
import { readLogScreen } from '@/features/logs/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { removeVisitAction } from './actions';

export const metadata = { title: 'Log' };

export default clubPage('log.write', async ({ scope }) => {
  const { slug, name } = scope.club;
  const { waiting, mine, club, visits } = await readLogScreen(scope, now());
  const addVisit = scope.can('visits.write') && (
    <ButtonLink href={`/clubs/${slug}/log/visits/new`}>Write down a visit</ButtonLink>
  );
  return (
    <>
      <PageTitle
        over={name}
        title="Log"
        lead="What each sit saw, none included: it tells the club which stands are alive and which need rest."
        actions={
          <>
            {addVisit}
            <ButtonLink look="quiet" href={`/clubs/${slug}/season/sightings`}>
              The season's figures
            </ButtonLink>
          </>
        }
      />
      <Section title="Waiting for a log">
        {waiting.length === 0 ? (
          <EmptyState title="Nothing waits">A sit is listed here from its start until its log is written.</EmptyState>
        ) : (
          <WaitingList club={slug} lines={waiting} />
        )}
      </Section>
      {mine.length > 0 && (
        <Section title="Written" note="Open a log to read or change it. What it said before is kept.">
          <LogList club={slug} lines={mine} />
        </Section>
      )}
      {club && (
        <Section
          title="The club's logs"
          note="Officers see that a log exists. What it says is shown as the club's rule allows."
        >
          {club.length === 0 ? (
            <EmptyState title="No sit in the last two weeks">
              Sits of the club are listed here once they end.
            </EmptyState>
          ) : (
            <ClubLogList club={slug} lines={club} />
          )}
        </Section>
      )}
      <Section title="Other visits" note="Camera checks, work, walks and drives press on the deer as sits do.">
        {visits.length === 0 ? (
          <EmptyState title="No visit in the last month" action={addVisit}>
            Write down what was done on the ground, so that the list of stands knows of it.
          </EmptyState>
        ) : (
          <VisitList club={slug} lines={visits} remove={removeVisitAction} />
        )}
      </Section>
    </>
  );
});
