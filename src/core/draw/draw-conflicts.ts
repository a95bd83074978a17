import type { BookingStand } from '../booking/booking-types';
import { clearApproaches } from '../booking/pass-through';
import { type ClubRules, spacingBetweenM } from '../booking/rules';
import { distanceM } from '../geometry';
import type { Point, Weapon } from '../types';
import type { Conflict, StandWays } from './allotment';

/** As in booking: distances this close are the same. */
const SAME_M = 0.001;

type DrawStand = Pick<BookingStand, 'id' | 'at' | 'approaches'>;

/**
 * Which stands of a draw stand in each other's way under the club's rules of spacing and of walking through. `weapons` are
 * those that members bring, by kind; `occupied` are the seats already taken in the window.
 */
export function drawConflicts(input: {
  stands: readonly DrawStand[];
  weapons: readonly Weapon[];
  occupied: readonly Point[];
  rules: ClubRules;
}): { conflicts: Conflict[]; ways: StandWays[] } {
  const { stands, weapons, occupied, rules } = input;
  const conflicts: Conflict[] = [];
  stands.forEach((one, a) => {
    stands.forEach((other, b) => {
      if (b <= a) return;
      const apart = distanceM(one.at, other.at);
      const close = weapons.flatMap((mine, i) =>
        weapons.flatMap((theirs, j) =>
          apart < spacingBetweenM(rules, mine, theirs) - SAME_M
            ? [{ a: { stand: a, kind: i }, b: { stand: b, kind: j } }]
            : [],
        ),
      );
      const always = close.length === weapons.length ** 2 && close.length > 0;
      if (always) conflicts.push({ a: { stand: a, kind: null }, b: { stand: b, kind: null } });
      else conflicts.push(...close);
    });
  });
  const ways: StandWays[] = [];
  if (rules.passThroughM > 0) {
    stands.forEach((one, stand) => {
      const open = clearApproaches(one.approaches, occupied, rules.passThroughM);
      const shutBy = one.approaches
        .filter((_, index) => open[index])
        .map((way) =>
          stands.flatMap((other, index) => {
            const clear = clearApproaches([way], [other.at], rules.passThroughM)[0];
            return index !== stand && !clear ? [index] : [];
          }),
        );
      if (shutBy.length > 0 && shutBy.every((by) => by.length > 0)) ways.push({ stand, shutBy });
    });
  }
  return { conflicts, ways };
}
