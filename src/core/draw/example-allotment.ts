import type { Allotment, Conflict, StandWays } from './allotment';

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

/** An invented draw: members of two weapons rank some of the stands, and chance decides which stand in each other's way. */
export function exampleAllotment(size: {
  members: number;
  stands: number;
  conflicts: number;
  seed: number;
  twoWay?: number;
}): Allotment {
  const next = chance(size.seed);
  const below = (limit: number) => Math.floor(next() * limit);
  const worth = Array.from({ length: size.members }, (_, turn) =>
    Array.from({ length: size.stands }, () => {
      if (next() < 0.3) return null;
      const choice = below(8);
      return Math.round((200 + 100 * 0.75 ** choice) * (2 - turn / size.members));
    }),
  );
  const two = () => {
    const a = below(size.stands);
    return { a, b: (a + 1 + below(size.stands - 1)) % size.stands };
  };
  const conflicts = Array.from({ length: size.conflicts }, (): Conflict => {
    const { a, b } = two();
    const always = next() < 0.8;
    const kind = () => (always ? null : below(2));
    return { a: { stand: a, kind: kind() }, b: { stand: b, kind: kind() } };
  });
  const ways = Array.from({ length: size.twoWay ?? 0 }, (): StandWays => {
    const { a, b } = two();
    const others = [b, (b + 1) % size.stands].filter((stand) => stand !== a);
    return { stand: a, shutBy: [others, [others[0] ?? b]] };
  });
  return { kinds: Array.from({ length: size.members }, (_, i) => i % 2), stands: size.stands, worth, conflicts, ways };
}
