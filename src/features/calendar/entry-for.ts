import type { CalendarPrivacy } from '@/core/booking/rules';
import type { SitDetail } from '@/features/bookings/data';
import type { EntryText } from '@/features/bookings/sit-calendar';
import { fullEntry } from '@/features/bookings/sit-entry';
import { SIT_WINDOW_WORDS } from '@/features/bookings/words/sits';
import { CALENDAR_ENTRY_WORDS } from './words';

interface Reader {
  memberId: string;
  privacy: CalendarPrivacy;
  withPlace: boolean;
}

/** What one reader's calendar says of a sit: everything of the reader's own, of others what the club lets be seen. */
export function entryFor(sit: SitDetail, club: { name: string }, reader: Reader): EntryText {
  if (sit.memberId === reader.memberId) return fullEntry(sit, club, reader.withPlace);
  const description = SIT_WINDOW_WORDS[sit.windows];
  if (reader.privacy === 'busy_only')
    return { summary: CALENDAR_ENTRY_WORDS.booked, description, location: null, place: null };
  if (reader.privacy === 'names_only') {
    return { summary: CALENDAR_ENTRY_WORDS.sitOf(sit.memberName), description, location: null, place: null };
  }
  return {
    summary: CALENDAR_ENTRY_WORDS.sitOfAt(sit.memberName, sit.standName),
    description,
    location: `${sit.standName}, ${club.name}`,
    place: reader.withPlace ? { lat: sit.standLat, lon: sit.standLon } : null,
  };
}
