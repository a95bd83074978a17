import type { BookingStand } from '../booking/booking-types';
import { clearApproaches } from '../booking/pass-through';
import { restGates } from '../booking/rest';
import { type ClubRules, spacingBetweenM } from '../booking/rules';
import { distanceM } from '../geometry';
import type { Point, Weapon } from '../ground-types';
import type { Conflict, PlaceWays } from './allotment';

/** As in booking: distances this close are the same. */
const SAME_M = 0.001;

type DrawStand = Pick<BookingStand, 'id' | 'name' | 'at' | 'approaches' | 'restDays'>;

/** Number of the place of a stand in a slot. */
export const placeAt = (slot: number, stand: number, stands: number) => slot * stands + stand;

/**
 * Which places of a draw stand in each other's way under the club's rules of spacing, of walking through and of rest.
 * `weapons` are those that members bring, by kind; a slot has its day (YYYY-MM-DD) and the seats already taken in it.
 */
export function drawConflicts(input: {
  slots: readonly { day: string; occupied: readonly Point[] }[];
  stands: readonly DrawStand[];
  weapons: readonly Weapon[];
  rules: ClubRules;
}): { conflicts: Conflict[]; ways: PlaceWays[] } {
  const { slots, stands, rules } = input;
  const near = nearStands(stands, input.weapons, rules);
  const spacing = slots.flatMap((_, slot) =>
    near.map(
      ({ a, b }): Conflict => ({
        a: { ...a, place: placeAt(slot, a.place, stands.length) },
        b: { ...b, place: placeAt(slot, b.place, stands.length) },
      }),
    ),
  );
  const ways = slots.flatMap(({ occupied }, slot) =>
    shutWays(stands, occupied, rules).map(({ place, shutBy }) => ({
      place: placeAt(slot, place, stands.length),
      shutBy: shutBy.map((by) => by.map((stand) => placeAt(slot, stand, stands.length))),
    })),
  );
  return { conflicts: [...spacing, ...restConflicts(slots, stands, rules)], ways };
}

/** Pairs of stands too near each other, for everybody or for some weapons only. */
function nearStands(stands: readonly DrawStand[], weapons: readonly Weapon[], rules: ClubRules): Conflict[] {
  return stands.flatMap((one, a) =>
    stands.slice(a + 1).flatMap((other, after): Conflict[] => {
      const b = a + 1 + after;
      const apart = distanceM(one.at, other.at);
      const close = weapons.flatMap((mine, i) =>
        weapons.flatMap((theirs, j) =>
          apart < spacingBetweenM(rules, mine, theirs) - SAME_M
            ? [{ a: { place: a, kind: i }, b: { place: b, kind: j } }]
            : [],
        ),
      );
      const always = close.length === weapons.length ** 2 && close.length > 0;
      return always ? [{ a: { place: a, kind: null }, b: { place: b, kind: null } }] : close;
    }),
  );
}

/** Stands whose every way in may be shut by others of the draw. */
function shutWays(stands: readonly DrawStand[], occupied: readonly Point[], rules: ClubRules): PlaceWays[] {
  if (rules.passThroughM <= 0) return [];
  return stands.flatMap((one, place) => {
    const open = clearApproaches(one.approaches, occupied, rules.passThroughM);
    const shutBy = one.approaches
      .filter((_, index) => open[index])
      .map((way) =>
        stands.flatMap((other, index) => {
          const clear = clearApproaches([way], [other.at], rules.passThroughM)[0];
          return index !== place && !clear ? [index] : [];
        }),
      );
    return shutBy.length > 0 && shutBy.every((by) => by.length > 0) ? [{ place, shutBy }] : [];
  });
}

/** The same stand on two days of the draw between which it has to rest. */
function restConflicts(slots: readonly { day: string }[], stands: readonly DrawStand[], rules: ClubRules): Conflict[] {
  return slots.flatMap((one, a) =>
    slots.slice(a + 1).flatMap((other, after) =>
      stands.flatMap((stand, at): Conflict[] => {
        const restDays = stand.restDays ?? rules.restDaysDefault;
        const sits = [{ day: one.day, memberName: '' }];
        if (restGates({ standName: stand.name, restDays, day: other.day, sits }).length === 0) return [];
        const use = (slot: number) => ({ place: placeAt(slot, at, stands.length), kind: null });
        return [{ a: use(a), b: use(a + 1 + after) }];
      }),
    ),
  );
}
