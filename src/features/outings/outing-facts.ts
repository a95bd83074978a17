import { dayAndWindow } from '@/features/bookings/words/sits';
import type { OutingDetail } from './data';
import { backByText, clockAndDay, lastSignText } from './words/outing';
import { OUTING_FACTS } from './words/sign';

interface Club {
  zone: string;
  units: 'us' | 'metric';
}

/** What somebody looking for a person needs, most useful first. No position. */
export function outingFacts(outing: OutingDetail, club: Club): { label: string; value: string }[] {
  const words = OUTING_FACTS;
  const say = (at: number) => clockAndDay(at, club);
  return [
    { label: words.stand, value: outing.standName },
    { label: words.wayIn, value: outing.approachName ?? words.notSaid },
    { label: words.parking, value: outing.parkingName ?? words.notSaid },
    { label: words.vehicle, value: outing.vehicle || words.notSaid },
    ...(outing.guests.length > 0
      ? [{ label: words.guests, value: outing.guests.map((guest) => guest.name).join(', ') }]
      : []),
    { label: words.sit, value: dayAndWindow(outing.day, outing.windows, true) },
    { label: words.signedIn, value: say(outing.signedInAt) },
    { label: words.backBy, value: backByText(outing, say) },
    { label: words.lastSign, value: lastSignText(outing, say) },
  ];
}
