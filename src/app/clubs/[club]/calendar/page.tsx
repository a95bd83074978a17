import type { Metadata } from 'next';
import type { CalendarPrivacy } from '@/core/booking/rules';
import { CalendarFeeds } from '@/features/calendar/components/calendar-feeds';
import { FEED_NAMES } from '@/features/calendar/feed-permission';
import { readFeeds } from '@/features/calendar/reads';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { makeFeedAction, revokeFeedAction } from './actions';

export const metadata: Metadata = { title: 'Calendar' };

const PRIVACY_TEXT: Record<CalendarPrivacy, string> = {
  names_and_stands: "By the club's rule it shows who sits and at which stand.",
  names_only: "By the club's rule it shows who sits, and stands only for your own sits.",
  busy_only: "By the club's rule it shows that a sit is booked, and names only for your own.",
};

export default clubPage('feeds.own', async ({ scope }) => {
  const { slug, name, rules } = scope.club;
  return (
    <>
      <PageTitle
        over={name}
        title="Calendar"
        lead="An address that a calendar on a phone or a computer can follow. Whoever has the address can read it without a password: give it to nobody, and turn it off when it is no longer needed."
      />
      <CalendarFeeds
        club={slug}
        feeds={await readFeeds(scope)}
        make={makeFeedAction}
        revoke={revokeFeedAction}
        texts={{
          own: {
            title: FEED_NAMES.own,
            note: 'Your sits with way in, guests and note. Cancelled ones show as cancelled.',
          },
          club: { title: FEED_NAMES.club, note: `Every sit of the club. ${PRIVACY_TEXT[rules.calendarPrivacy]}` },
        }}
      />
    </>
  );
});
