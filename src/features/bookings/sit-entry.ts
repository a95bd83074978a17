import { weaponWord } from '@/core/booking/seasons';
import type { SitDetail } from './data';
import type { EntryText } from './sit-calendar';
import { SIT_WINDOW_WORDS } from './sit-words';

/** 'by Creek way from North gate'; null when no way in is named. */
export function wayInText(sit: Pick<SitDetail, 'approachName' | 'parkingName'>): string | null {
  if (sit.approachName === null) return null;
  return sit.parkingName === null ? sit.approachName : `${sit.approachName} from ${sit.parkingName}`;
}

/** A sit with all its words, for those who may see them. */
export function fullEntry(sit: SitDetail, club: { name: string }, withPlace: boolean): EntryText {
  const way = wayInText(sit);
  const lines = [
    `${sit.memberName}, ${SIT_WINDOW_WORDS[sit.windows]}, ${weaponWord(sit.weapon)}`,
    way === null ? null : `Way in: ${way}`,
    sit.guests.length === 0 ? null : `Guests: ${sit.guests.map((guest) => guest.name).join(', ')}`,
    sit.note === '' ? null : `Note: ${sit.note}`,
    sit.cancelReason === null ? null : `Cancelled: ${sit.cancelReason}`,
  ];
  return {
    summary: `Sit: ${sit.standName}`,
    description: lines.filter((line) => line !== null).join('\n'),
    location: `${sit.standName}, ${club.name}`,
    place: withPlace ? { lat: sit.standLat, lon: sit.standLon } : null,
  };
}
