/**
 * Who may be given which place, and what each giving is worth. A place is one stand in one slot; a slot is a window of a
 * day, and no two slots share hours. Members, slots and places are numbered from 0; a kind is a group of members for whom
 * the distances between stands are the same (a weapon).
 */
export interface Allotment {
  /** Kind of each member, 0 or more. */
  kinds: number[];
  slots: number;
  /** Slot of each place. */
  slotOf: number[];
  /** worth[member][place], 0 or more; null: a rule forbids it, or it was not asked for. */
  worth: (number | null)[][];
  /** steps[member][n]: what the place numbered n that a member is given adds besides; 0 or more, never rising. */
  steps: number[][];
  /** Pairs of places of which one at most is used. */
  conflicts: Conflict[];
  /** Places that are reached by at least one way clear of every place used. */
  ways: PlaceWays[];
  limits: Limit[];
}

export interface Use {
  place: number;
  /** null: whoever sits there. */
  kind: number | null;
}

export interface Conflict {
  a: Use;
  b: Use;
}

export interface PlaceWays {
  place: number;
  /** For each way in, the places that shut it while somebody sits there. */
  shutBy: number[][];
}

/** Of these places a member is given so many at most; with a null member, so many are used by anybody. */
export interface Limit {
  member: number | null;
  places: number[];
  most: number;
}

/** given[member][slot]: the place; null: none. */
export type Given = (number | null)[][];

export type Fault =
  | 'forbidden'
  | 'place_twice'
  | 'conflict'
  | 'no_way'
  | 'limit'
  /** As many answers as members and slots are wanted, each a place of its slot. */
  | 'wrong_shape';

export function nothingGiven({ kinds, slots }: Pick<Allotment, 'kinds' | 'slots'>): Given {
  return kinds.map(() => Array.from({ length: slots }, () => null));
}

export function placesOf(given: Given, member: number | null): number[] {
  const rows = member === null ? given : [given[member] ?? []];
  return rows.flat().filter((place) => place !== null);
}

function holds(use: Use, given: Given, kinds: readonly number[]): boolean {
  return given.some((row, member) => row.includes(use.place) && (use.kind === null || kinds[member] === use.kind));
}

/** The first thing that stands against an answer; null: it keeps every rule. */
export function faultOf(allotment: Allotment, given: Given): Fault | null {
  const { kinds, slots, slotOf, worth, conflicts, ways, limits } = allotment;
  const shaped = given.every(
    (row) => row.length === slots && row.every((place, slot) => place === null || slotOf[place] === slot),
  );
  if (given.length !== kinds.length || !shaped) return 'wrong_shape';
  if (given.some((row, member) => row.some((place) => place !== null && (worth[member]?.[place] ?? null) === null))) {
    return 'forbidden';
  }
  const used = placesOf(given, null);
  if (new Set(used).size < used.length) return 'place_twice';
  if (conflicts.some(({ a, b }) => holds(a, given, kinds) && holds(b, given, kinds))) return 'conflict';
  const shut = ways.some(
    ({ place, shutBy }) => used.includes(place) && shutBy.every((by) => by.some((other) => used.includes(other))),
  );
  if (shut) return 'no_way';
  const over = limits.some(
    ({ member, places, most }) => placesOf(given, member).filter((place) => places.includes(place)).length > most,
  );
  return over ? 'limit' : null;
}

/** Sum of what was given is worth, with the steps. */
export function totalWorth({ worth, steps }: Allotment, given: Given): number {
  const sum = (values: (number | null | undefined)[]) => values.reduce<number>((all, one) => all + (one ?? 0), 0);
  return sum(
    given.map((_, member) => {
      const places = placesOf(given, member);
      return sum(places.map((place) => worth[member]?.[place])) + sum(places.map((_, n) => steps[member]?.[n]));
    }),
  );
}
