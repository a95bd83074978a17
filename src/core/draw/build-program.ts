import type { Allotment, Given, Place } from './allotment';

/** A sum to make as great as it gets over columns that are each 0 or 1. */
export interface ZeroOneProgram {
  gain: number[];
  /** Sum of value times column is `most` or less. */
  rows: { columns: number[]; values: number[]; most: number }[];
}

export interface AllotmentProgram {
  program: ZeroOneProgram;
  /** Column of each member and stand; other columns say that a stand is used or a way is kept clear. */
  givings: { member: number; stand: number; column: number }[];
}

const placeKey = ({ stand, kind }: Place) => `${stand}/${kind ?? ''}`;

/**
 * The allotment as a 0/1 program. Conflicts are written on one "used" column a stand, not on the givings: the same
 * answers, found many times sooner.
 */
export function buildProgram(allotment: Allotment): AllotmentProgram {
  const { kinds, worth, conflicts, ways } = allotment;
  const gain: number[] = [];
  const rows: ZeroOneProgram['rows'] = [];
  const column = (value: number) => gain.push(value) - 1;
  const most = (limit: number, plus: number[], minus: number[] = []) =>
    rows.push({ columns: [...plus, ...minus], values: [...plus.map(() => 1), ...minus.map(() => -1)], most: limit });

  const givings = worth.flatMap((row, member) =>
    row.flatMap((value, stand) => (value === null ? [] : [{ member, stand, column: column(value) }])),
  );
  const at = (place: Place) =>
    givings
      .filter((one) => one.stand === place.stand && (place.kind === null || kinds[one.member] === place.kind))
      .map((one) => one.column);
  kinds.forEach((_, member) => {
    const own = givings.filter((one) => one.member === member).map((one) => one.column);
    if (own.length > 1) most(1, own);
  });
  for (let stand = 0; stand < allotment.stands; stand++) {
    const here = at({ stand, kind: null });
    if (here.length > 1) most(1, here);
  }

  const used = new Map<string, number | null>();
  const usedAt = (place: Place): number | null => {
    const key = placeKey(place);
    const known = used.get(key);
    if (known !== undefined) return known;
    const here = at(place);
    const made = here.length === 0 ? null : column(0);
    if (made !== null) most(0, here, [made]);
    used.set(key, made);
    return made;
  };
  for (const { a, b } of conflicts) {
    const [one, other] = [usedAt(a), usedAt(b)];
    if (one !== null && other !== null) most(1, [one, other]);
  }
  for (const { stand, shutBy } of ways) {
    const here = usedAt({ stand, kind: null });
    if (here === null) continue;
    const clear = shutBy.map((by) => {
      const kept = column(0);
      for (const other of by) {
        const there = usedAt({ stand: other, kind: null });
        if (there !== null) most(1, [kept, there]);
      }
      return kept;
    });
    most(0, [here], clear);
  }
  return { program: { gain, rows }, givings };
}

/** The stand given to each member by a solved program; `columns` as the solver left them, 0 or 1. */
export function readGiven(allotment: Allotment, built: AllotmentProgram, columns: ArrayLike<number>): Given {
  const given: Given = allotment.kinds.map(() => null);
  for (const { member, stand, column } of built.givings) {
    if ((columns[column] ?? 0) > 0.5) given[member] = stand;
  }
  return given;
}
