import type { Metadata } from 'next';
import { PastSits } from '@/features/bookings/components/past-sits';
import { UpcomingSits } from '@/features/bookings/components/upcoming-sits';
import { readMySits, readSitOptions } from '@/features/bookings/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { cancelSitAction, changeSitAction } from '../sit/actions';

export const metadata: Metadata = { title: 'My sits' };

export default clubPage('sits.book', async ({ scope }) => {
  const { slug, name } = scope.club;
  const { upcoming, past } = await readMySits(scope, now());
  const book = <ButtonLink href={`/clubs/${slug}/sit`}>Find a stand</ButtonLink>;
  const calendar = scope.can('feeds.own') && (
    <ButtonLink look="quiet" href={`/clubs/${slug}/calendar`}>
      Put them in my calendar
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        over={name}
        title="My sits"
        actions={
          <>
            {book}
            {calendar}
          </>
        }
      />
      <Section title="To come">
        {upcoming.length === 0 ? (
          <EmptyState title="You hold no sit">Choose a day on the list of stands and book one.</EmptyState>
        ) : (
          <UpcomingSits
            club={slug}
            sits={upcoming}
            options={await readSitOptions(scope)}
            change={changeSitAction}
            cancel={cancelSitAction}
          />
        )}
      </Section>
      {past.length > 0 && (
        <Section title="Past" note="Ended and cancelled sits stay on record.">
          <PastSits sits={past} />
        </Section>
      )}
    </>
  );
});
