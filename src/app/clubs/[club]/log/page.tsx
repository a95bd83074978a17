import { ClubLogList, LogList } from '@/features/logs/components/log-list';
import { VisitList } from '@/features/logs/components/visit-list';
import { WaitingList } from '@/features/logs/components/waiting-list';
import { readLogScreen } from '@/features/logs/reads';
import { LOG_PAGE_WORDS } from '@/features/logs/words/screen';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { removeVisitAction } from './actions';

const words = LOG_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('log.write', async ({ scope }) => {
  const { slug, name } = scope.club;
  const { waiting, mine, club, visits } = await readLogScreen(scope, now());
  const addVisit = scope.can('visits.write') && (
    <ButtonLink href={`/clubs/${slug}/log/visits/new`}>{words.addVisit}</ButtonLink>
  );
  return (
    <>
      <PageTitle
        over={name}
        title={words.title}
        lead={words.lead}
        actions={
          <>
            {addVisit}
            <ButtonLink look="quiet" href={`/clubs/${slug}/season/sightings`}>
              {words.figures}
            </ButtonLink>
          </>
        }
      />
      <Section title={words.waiting}>
        {waiting.length === 0 ? (
          <EmptyState title={words.nothingWaits}>{words.nothingWaitsText}</EmptyState>
        ) : (
          <WaitingList club={slug} lines={waiting} />
        )}
      </Section>
      {mine.length > 0 && (
        <Section title={words.written} note={words.writtenNote}>
          <LogList club={slug} lines={mine} />
        </Section>
      )}
      {club && (
        <Section title={words.club} note={words.clubNote}>
          {club.length === 0 ? (
            <EmptyState title={words.clubEmpty}>{words.clubEmptyText}</EmptyState>
          ) : (
            <ClubLogList club={slug} lines={club} />
          )}
        </Section>
      )}
      <Section title={words.visits} note={words.visitsNote}>
        {visits.length === 0 ? (
          <EmptyState title={words.visitsEmpty} action={addVisit}>
            {words.visitsEmptyText}
          </EmptyState>
        ) : (
          <VisitList club={slug} lines={visits} remove={removeVisitAction} />
        )}
      </Section>
    </>
  );
});
