/**
 * Who may be given which stand for one window, and what each giving is worth. Members and stands are numbered from 0; a
 * kind is a group of members for whom the distances between stands are the same (a weapon).
 */
export interface Allotment {
  /** Kind of each member, 0 or more. */
  kinds: number[];
  stands: number;
  /** worth[member][stand], above 0; null: a rule forbids it, or it was not asked for. */
  worth: (number | null)[][];
  /** Pairs of stands of which one at most is used; a kind of null means whoever sits there. */
  conflicts: Conflict[];
  /** Stands that are reached by at least one way clear of every stand used. */
  ways: StandWays[];
}

export interface Place {
  stand: number;
  kind: number | null;
}

export interface Conflict {
  a: Place;
  b: Place;
}

export interface StandWays {
  stand: number;
  /** For each way in, the stands that shut it while somebody sits there. */
  shutBy: number[][];
}

/** The stand given to each member; null: none. */
export type Given = (number | null)[];

export type Fault =
  | 'forbidden'
  | 'stand_twice'
  | 'conflict'
  | 'no_way'
  /** As many answers as members are wanted. */
  | 'wrong_length';

function holds(place: Place, given: Given, kinds: readonly number[]): boolean {
  return given.some((stand, member) => stand === place.stand && (place.kind === null || kinds[member] === place.kind));
}

/** The first thing that stands against an answer; null: it keeps every rule. */
export function faultOf(allotment: Allotment, given: Given): Fault | null {
  const { kinds, worth, conflicts, ways } = allotment;
  if (given.length !== kinds.length) return 'wrong_length';
  const used = given.filter((stand) => stand !== null);
  if (given.some((stand, member) => stand !== null && (worth[member]?.[stand] ?? null) === null)) return 'forbidden';
  if (new Set(used).size < used.length) return 'stand_twice';
  if (conflicts.some(({ a, b }) => holds(a, given, kinds) && holds(b, given, kinds))) return 'conflict';
  const shut = ways.some(
    ({ stand, shutBy }) => used.includes(stand) && shutBy.every((by) => by.some((other) => used.includes(other))),
  );
  return shut ? 'no_way' : null;
}

/** Sum of what was given is worth. */
export function totalWorth(allotment: Allotment, given: Given): number {
  return given.reduce<number>(
    (sum, stand, member) => sum + (stand === null ? 0 : (allotment.worth[member]?.[stand] ?? 0)),
    0,
  );
}
