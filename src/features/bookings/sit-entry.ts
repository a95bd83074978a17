import { weaponWord } from '@/core/booking/seasons';
import type { SitDetail } from './data';
import type { EntryText } from './sit-calendar';
import { SIT_ENTRY_WORDS } from './words/entries';
import { SIT_WINDOW_WORDS } from './words/sits';

/** 'by Creek way from North gate'; null when no way in is named. */
export function wayInText(sit: Pick<SitDetail, 'approachName' | 'parkingName'>): string | null {
  if (sit.approachName === null) return null;
  return sit.parkingName === null ? sit.approachName : SIT_ENTRY_WORDS.way(sit.approachName, sit.parkingName);
}

/** A sit with all its words, for those who may see them. */
export function fullEntry(sit: SitDetail, club: { name: string }, withPlace: boolean): EntryText {
  const way = wayInText(sit);
  const lines = [
    `${sit.memberName}, ${SIT_WINDOW_WORDS[sit.windows]}, ${weaponWord(sit.weapon)}`,
    way === null ? null : SIT_ENTRY_WORDS.wayIn(way),
    sit.guests.length === 0 ? null : SIT_ENTRY_WORDS.guests(sit.guests.map((guest) => guest.name)),
    sit.note === '' ? null : SIT_ENTRY_WORDS.note(sit.note),
    sit.cancelReason === null ? null : SIT_ENTRY_WORDS.cancelled(sit.cancelReason),
  ];
  return {
    summary: SIT_ENTRY_WORDS.sit(sit.standName),
    description: lines.filter((line) => line !== null).join('\n'),
    location: `${sit.standName}, ${club.name}`,
    place: withPlace ? { lat: sit.standLat, lon: sit.standLon } : null,
  };
}
