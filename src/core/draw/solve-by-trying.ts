import { type Allotment, faultOf, type Given, totalWorth } from './allotment';

/** The best answer by trying every one there is; only for a handful of members. A yardstick for tests. */
export function solveByTrying(allotment: Allotment): { value: number; given: Given } {
  const members = allotment.kinds.length;
  let best: { value: number; given: Given } = { value: 0, given: allotment.kinds.map(() => null) };
  const given: Given = [...best.given];
  const used = new Set<number>();
  function place(member: number): void {
    if (member === members) {
      const value = totalWorth(allotment, given);
      if (value > best.value && faultOf(allotment, given) === null) best = { value, given: [...given] };
      return;
    }
    place(member + 1);
    for (let stand = 0; stand < allotment.stands; stand++) {
      if (used.has(stand) || (allotment.worth[member]?.[stand] ?? null) === null) continue;
      given[member] = stand;
      used.add(stand);
      place(member + 1);
      used.delete(stand);
      given[member] = null;
    }
  }
  place(0);
  return best;
}
