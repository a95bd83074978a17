import type { Metadata } from 'next';
import type { CalendarPrivacy } from '@/core/booking/rules';
import { CalendarFeeds } from '@/features/calendar/components/calendar-feeds';
import { readFeeds } from '@/features/calendar/reads';
import { CALENDAR_PAGE_WORDS, CALENDAR_PRIVACY_WORDS, FEED_NAMES } from '@/features/calendar/words';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { makeFeedAction, revokeFeedAction } from './actions';

export const metadata: Metadata = { title: CALENDAR_PAGE_WORDS.title };

const PRIVACY_TEXT: Record<CalendarPrivacy, string> = {
  names_and_stands: CALENDAR_PRIVACY_WORDS.namesAndStands,
  names_only: CALENDAR_PRIVACY_WORDS.namesOnly,
  busy_only: CALENDAR_PRIVACY_WORDS.busyOnly,
};

export default clubPage('feeds.own', async ({ scope }) => {
  const { slug, name, rules } = scope.club;
  return (
    <>
      <PageTitle over={name} title={CALENDAR_PAGE_WORDS.title} lead={CALENDAR_PAGE_WORDS.lead} />
      <CalendarFeeds
        club={slug}
        feeds={await readFeeds(scope)}
        make={makeFeedAction}
        revoke={revokeFeedAction}
        texts={{
          own: {
            title: FEED_NAMES.own,
            note: CALENDAR_PAGE_WORDS.ownNote,
          },
          club: { title: FEED_NAMES.club, note: CALENDAR_PAGE_WORDS.clubNote(PRIVACY_TEXT[rules.calendarPrivacy]) },
        }}
      />
    </>
  );
});
