import type { WindowName } from '../condition-types';
import { distanceM } from '../geometry';
import type { Weapon } from '../ground-types';
import { formatExactDistance, type Units } from '../units';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import type { BookingStand, OtherSit } from './booking-types';
import { type ClubRules, spacingBetweenM } from './rules';

/** Distances this close are the same: below what any survey or unit conversion can tell. */
const SAME_M = 0.001;

/** Sits at other stands in one of the windows of a day. */
export function sitsBeside(
  standId: string,
  day: string,
  windows: readonly WindowName[],
  sits: readonly OtherSit[],
): OtherSit[] {
  return sits.filter((s) => s.standId !== standId && s.day === day && s.windows.some((w) => windows.includes(w)));
}

/** Least distance to every stand occupied in the same window; exactly the distance is enough. */
export function spacingGates(input: {
  rules: ClubRules;
  stand: Pick<BookingStand, 'id' | 'name' | 'at'>;
  day: string;
  windows: readonly WindowName[];
  weapon: Weapon | null;
  sits: readonly OtherSit[];
  units: Units;
}): Gate[] {
  const { rules, stand, units } = input;
  return sitsBeside(stand.id, input.day, input.windows, input.sits).flatMap((sit): Gate[] => {
    const least = spacingBetweenM(rules, input.weapon, sit.weapon);
    const apart = distanceM(stand.at, sit.standAt);
    if (apart >= least - SAME_M) return [];
    const text = GATE_WORDS.spacing({
      stand: stand.name,
      apart: formatExactDistance(apart, units),
      other: sit.standName,
      member: sit.memberName,
      least: formatExactDistance(least, units),
    });
    return [{ code: 'spacing', text, endsOn: null }];
  });
}
