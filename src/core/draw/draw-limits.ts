import { mostLiveClaims } from '../booking/claim-limits';
import { huntingYear } from '../booking/hunting-year';
import type { ClubRules } from '../booking/rules';
import type { Limit } from './allotment';
import { placeAt } from './draw-conflicts';

/** What a member holds before the draw; a list has a value for each slot, of the season its day falls in. */
export interface MemberHolds {
  liveClaims: number;
  seasonSits: readonly number[];
  /** Whether guests who come along to all of these slots take more guest days than are left; null: no guests. */
  guestsOver: ((slots: readonly number[]) => boolean) | null;
}

export interface StandHolds {
  mostSitsSeason: number | null;
  seasonSits: readonly number[];
}

/** The limits of the club that count over several slots: claims at once, sits of a season, guest days. */
export function drawLimits(input: {
  rules: Pick<ClubRules, 'maxLiveClaims' | 'claimAhead' | 'mostSitsPerMemberSeason'>;
  slots: readonly { day: string }[];
  stands: readonly StandHolds[];
  members: readonly MemberHolds[];
}): Limit[] {
  const { rules, slots, stands } = input;
  const seasons = slotsBySeason(slots);
  const placesIn = (inSlots: readonly number[]) =>
    inSlots.flatMap((slot) => stands.map((_, stand) => placeAt(slot, stand, stands.length)));
  const left = (most: number, had: number | undefined) => Math.max(0, most - (had ?? 0));
  const limits: Limit[] = [];
  input.members.forEach((held, member) => {
    const live = mostLiveClaims(rules);
    const all = slots.map((_, slot) => slot);
    if (live !== null) limits.push({ member, places: placesIn(all), most: left(live, held.liveClaims) });
    for (const season of seasons) {
      const most = rules.mostSitsPerMemberSeason;
      const had = held.seasonSits[season[0] ?? 0];
      if (most !== null) limits.push({ member, places: placesIn(season), most: left(most, had) });
      if (!held.guestsOver) continue;
      for (const over of smallestSets(season, held.guestsOver)) {
        limits.push({ member, places: placesIn(over), most: over.length - 1 });
      }
    }
  });
  stands.forEach(({ mostSitsSeason, seasonSits }, stand) => {
    if (mostSitsSeason === null) return;
    for (const season of seasons) {
      const places = season.map((slot) => placeAt(slot, stand, stands.length));
      limits.push({ member: null, places, most: left(mostSitsSeason, seasonSits[season[0] ?? 0]) });
    }
  });
  return limits;
}

function slotsBySeason(slots: readonly { day: string }[]): number[][] {
  const seasons = new Map<string, number[]>();
  slots.forEach(({ day }, slot) => {
    const { fromDay } = huntingYear(day);
    seasons.set(fromDay, [...(seasons.get(fromDay) ?? []), slot]);
  });
  return [...seasons.values()];
}

/** Every set of slots that is over while no smaller set within it is; for the handful of slots of one draw. */
export function smallestSets(slots: readonly number[], isOver: (slots: readonly number[]) => boolean): number[][] {
  const sets = Array.from({ length: 2 ** slots.length - 1 }, (_, n) =>
    slots.filter((_, at) => Math.floor((n + 1) / 2 ** at) % 2 === 1),
  ).sort((a, b) => a.length - b.length);
  const found: number[][] = [];
  for (const set of sets) {
    if (!found.some((one) => one.every((slot) => set.includes(slot))) && isOver(set)) found.push(set);
  }
  return found;
}
