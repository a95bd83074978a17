import type { Allotment, Conflict, PlaceWays } from './allotment';

/** Chance that comes out the same every time (mulberry32). For tests and the bench. */
function chance(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

interface Size {
  members: number;
  stands: number;
  conflicts: number;
  seed: number;
  twoWay?: number;
  slots?: number;
}

/**
 * An invented draw: members of two weapons rank some of the stands, chance decides which stand in each other's way, every
 * stand rests after the first slot until the third, and one member in three is allowed one place less than there are slots.
 */
export function exampleAllotment(size: Size): Allotment {
  const { members, stands, slots = 1 } = size;
  const next = chance(size.seed);
  const below = (limit: number) => Math.floor(next() * limit);
  const weight = (turn: number) => 2 - turn / members;
  const slotNumbers = Array.from({ length: slots }, (_, slot) => slot);
  const worth = Array.from({ length: members }, (_, turn) =>
    Array.from({ length: stands * slots }, () =>
      next() < 0.3 ? null : Math.round(100 * 0.75 ** below(8) * weight(turn)),
    ),
  );
  const two = () => {
    const a = below(stands);
    return { a, b: (a + 1 + below(stands - 1)) % stands };
  };
  const conflicts = Array.from({ length: size.conflicts }, () => {
    const { a, b } = two();
    const always = next() < 0.8;
    const kind = () => (always ? null : below(2));
    return { a: { place: a, kind: kind() }, b: { place: b, kind: kind() } };
  }).flatMap(({ a, b }) =>
    slotNumbers.map(
      (slot): Conflict => ({
        a: { ...a, place: a.place + slot * stands },
        b: { ...b, place: b.place + slot * stands },
      }),
    ),
  );
  const rests = (slots > 2 ? Array.from({ length: stands }, (_, stand) => stand) : []).map(
    (stand): Conflict => ({ a: { place: stand, kind: null }, b: { place: stand + 2 * stands, kind: null } }),
  );
  const ways = Array.from({ length: size.twoWay ?? 0 }, (): PlaceWays => {
    const { a, b } = two();
    const others = [b, (b + 1) % stands].filter((stand) => stand !== a);
    return { place: a, shutBy: [others, [others[0] ?? b]] };
  });
  const places = Array.from({ length: stands * slots }, (_, place) => place);
  const limited = slots > 1 ? worth.flatMap((_, member) => (member % 3 === 0 ? [member] : [])) : [];
  return {
    kinds: worth.map((_, member) => member % 2),
    slots,
    slotOf: places.map((place) => Math.floor(place / stands)),
    worth,
    steps: worth.map((_, turn) => slotNumbers.map((n) => Math.round((n === 0 ? 300 : 100 / 2 ** n) * weight(turn)))),
    conflicts: [...conflicts, ...rests],
    ways,
    limits: limited.map((member) => ({ member, places, most: slots - 1 })),
  };
}
