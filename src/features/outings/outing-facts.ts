import { dayAndWindow } from '@/features/bookings/sit-words';
import type { OutingDetail } from './data';
import { backByText, clockAndDay, lastSignText } from './outing-words';

interface Club {
  zone: string;
  units: 'us' | 'metric';
}

/** What somebody looking for a person needs, most useful first. No position. */
export function outingFacts(outing: OutingDetail, club: Club): { label: string; value: string }[] {
  const say = (at: number) => clockAndDay(at, club);
  return [
    { label: 'Stand', value: outing.standName },
    { label: 'Way in', value: outing.approachName ?? 'Not said' },
    { label: 'Parked at', value: outing.parkingName ?? 'Not said' },
    { label: 'Vehicle', value: outing.vehicle || 'Not said' },
    ...(outing.guests.length > 0
      ? [{ label: 'With', value: outing.guests.map((guest) => guest.name).join(', ') }]
      : []),
    { label: 'Sit', value: dayAndWindow(outing.day, outing.windows, true) },
    { label: 'Signed in', value: say(outing.signedInAt) },
    { label: 'Back by', value: backByText(outing, say) },
    { label: 'Last sign', value: lastSignText(outing, say) },
  ];
}
