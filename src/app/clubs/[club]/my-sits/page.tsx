import type { Metadata } from 'next';
import { dayOf } from '@/core/day-time';
import { PastSits } from '@/features/bookings/components/past-sits';
import { UpcomingSits } from '@/features/bookings/components/upcoming-sits';
import { readMySits, readSitOptions } from '@/features/bookings/reads';
import { MY_SITS_PAGE_WORDS } from '@/features/bookings/words/screens';
import { readSeasonCautions } from '@/features/harvest/quota-cautions';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { cancelSitAction, changeSitAction } from '../sit/actions';

export const metadata: Metadata = { title: MY_SITS_PAGE_WORDS.title };

export default clubPage('sits.book', async ({ scope }) => {
  const { slug, name, zone } = scope.club;
  const at = now();
  const { upcoming, past } = await readMySits(scope, at);
  const book = <ButtonLink href={`/clubs/${slug}/sit`}>{MY_SITS_PAGE_WORDS.find}</ButtonLink>;
  const calendar = scope.can('feeds.own') && (
    <ButtonLink look="quiet" href={`/clubs/${slug}/calendar`}>
      {MY_SITS_PAGE_WORDS.calendar}
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        over={name}
        title={MY_SITS_PAGE_WORDS.title}
        actions={
          <>
            {book}
            {calendar}
          </>
        }
      />
      <Section title={MY_SITS_PAGE_WORDS.toCome}>
        {upcoming.length === 0 ? (
          <EmptyState title={MY_SITS_PAGE_WORDS.none}>{MY_SITS_PAGE_WORDS.noneText}</EmptyState>
        ) : (
          <UpcomingSits
            club={slug}
            sits={upcoming}
            options={await readSitOptions(scope)}
            quotas={await readSeasonCautions(scope, [dayOf(at, zone), ...upcoming.map(({ day }) => day)])}
            change={changeSitAction}
            cancel={cancelSitAction}
          />
        )}
      </Section>
      {past.length > 0 && (
        <Section title={MY_SITS_PAGE_WORDS.past} note={MY_SITS_PAGE_WORDS.pastNote}>
          <PastSits sits={past} />
        </Section>
      )}
    </>
  );
});
