import { type Allotment, type Given, nothingGiven, type Use } from './allotment';
import { coverCliques } from './cover-cliques';

/** A sum to make as great as it gets over columns from 0 to 1. */
export interface Program {
  gain: number[];
  /**
   * Columns that must be told to be 0 or 1. The others come out so by themselves at a corner of what is left once these
   * are settled; a solver that finds one in between has to be asked again with all of them told.
   */
  whole: boolean[];
  /** Sum of value times column is `most` or less. */
  rows: { columns: number[]; values: number[]; most: number }[];
}

export interface AllotmentProgram {
  program: Program;
  /** Column of each member and place; other columns say that a place is used, a way is kept clear, a step is reached. */
  givings: { member: number; place: number; column: number }[];
}

type Node = Use & { column: number };

const isOf = (use: Use, node: Use) => node.place === use.place && (use.kind === null || node.kind === use.kind);

/**
 * The allotment as a program. Whatever stands between places is written on one "used" column a place (and kind, where
 * that counts), as groups of which one is used at most; only these columns are told to be whole. With them settled the
 * rest is a flow from members to places, whose corners are whole (Hoffman and Kruskal 1956).
 */
export function buildProgram(allotment: Allotment): AllotmentProgram {
  const { kinds, slots, slotOf, worth, steps, ways, limits } = allotment;
  const program: Program = { gain: [], whole: [], rows: [] };
  const column = (gain: number, whole: boolean) => {
    program.whole.push(whole);
    return program.gain.push(gain) - 1;
  };
  const most = (limit: number, plus: number[], minus: number[] = []) =>
    program.rows.push({
      columns: [...plus, ...minus],
      values: [...plus.map(() => 1), ...minus.map(() => -1)],
      most: limit,
    });

  const oneAtMost = slots === 1;
  const givings = worth.flatMap((row, member) =>
    row.flatMap((value, place) => {
      if (value === null) return [];
      return [{ member, place, column: column(value + (oneAtMost ? (steps[member]?.[0] ?? 0) : 0), false) }];
    }),
  );
  kinds.forEach((_, member) => {
    const own = givings.filter((one) => one.member === member);
    for (let slot = 0; slot < slots; slot++) {
      const inSlot = own.filter((one) => slotOf[one.place] === slot).map((one) => one.column);
      if (inSlot.length > 1) most(1, inSlot);
    }
    if (oneAtMost || own.length === 0) return;
    const reached = (steps[member] ?? []).slice(0, slots).map((gain) => column(gain, false));
    const all = own.map((one) => one.column);
    most(0, reached, all);
  });

  const nodes = usedNodes(allotment, givings, (here) => {
    const used = column(0, true);
    most(0, here, [used]);
    return used;
  });
  for (const clique of coverCliques(nodesInWay(allotment, nodes))) most(1, columnsAt(nodes, clique));

  const usedAt = (place: number) => nodes.filter((node) => node.place === place).map((node) => node.column);
  for (const { place, shutBy } of ways) {
    const here = usedAt(place);
    if (here.length === 0) continue;
    const clear = shutBy.map((by) => {
      const kept = column(0, true);
      for (const other of by) if (usedAt(other).length > 0) most(1, [kept, ...usedAt(other)]);
      return kept;
    });
    most(0, here, clear);
  }
  for (const { member, places, most: limit } of limits) {
    const here = givings.filter((one) => places.includes(one.place) && (member === null || one.member === member));
    if (here.length > limit) {
      most(
        limit,
        here.map((one) => one.column),
      );
    }
  }
  return { program, givings };
}

/** One node a place, or one a place and kind where some conflict asks who sits there. */
function usedNodes(
  { kinds, slotOf, conflicts }: Allotment,
  givings: AllotmentProgram['givings'],
  used: (givingColumns: number[]) => number,
): Node[] {
  const uses = conflicts.flatMap(({ a, b }) => [a, b]);
  const byKind = new Set(uses.filter((use) => use.kind !== null).map((use) => use.place));
  const allKinds = [...new Set(kinds)].sort((a, b) => a - b);
  return slotOf.flatMap((_, place) =>
    (byKind.has(place) ? allKinds : [null]).flatMap((kind) => {
      const here = givings.filter((one) => one.place === place && (kind === null || kinds[one.member] === kind));
      return here.length === 0 ? [] : [{ place, kind, column: used(here.map((one) => one.column)) }];
    }),
  );
}

function nodesInWay({ conflicts }: Allotment, nodes: readonly Node[]): boolean[][] {
  const inWay = nodes.map((one, a) => nodes.map((other, b) => a !== b && one.place === other.place));
  for (const { a, b } of conflicts) {
    nodes.forEach((one, i) => {
      if (!isOf(a, one)) return;
      nodes.forEach((other, j) => {
        if (i === j || !isOf(b, other)) return;
        for (const [from, to] of [
          [i, j],
          [j, i],
        ] as const) {
          const row = inWay[from];
          if (row) row[to] = true;
        }
      });
    });
  }
  return inWay;
}

const columnsAt = (nodes: readonly Node[], indices: readonly number[]) =>
  indices.flatMap((index) => nodes[index]?.column ?? []);

/** The place given to each member in each slot by a solved program; `columns` as the solver left them, 0 or 1. */
export function readGiven(allotment: Allotment, built: AllotmentProgram, columns: ArrayLike<number>): Given {
  const given = nothingGiven(allotment);
  for (const { member, place, column } of built.givings) {
    const row = given[member];
    const slot = allotment.slotOf[place];
    if (row && slot !== undefined && (columns[column] ?? 0) > 0.5) row[slot] = place;
  }
  return given;
}
