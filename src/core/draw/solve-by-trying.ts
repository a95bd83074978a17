import { type Allotment, faultOf, type Given, nothingGiven, totalWorth } from './allotment';

/** The best answer by trying every one there is; only for a handful of members. A yardstick for tests. */
export function solveByTrying(allotment: Allotment): { value: number; given: Given } {
  const { kinds, slots, slotOf, worth } = allotment;
  let best = { value: 0, given: nothingGiven(allotment) };
  const given = nothingGiven(allotment);
  const used = new Set<number>();
  function settle(turn: number): void {
    const member = Math.floor(turn / slots);
    const slot = turn % slots;
    const row = given[member];
    if (!row) {
      const value = totalWorth(allotment, given);
      if (value > best.value && faultOf(allotment, given) === null) {
        best = { value, given: given.map((one) => [...one]) };
      }
      return;
    }
    settle(turn + 1);
    slotOf.forEach((at, place) => {
      if (at !== slot || used.has(place) || (worth[member]?.[place] ?? null) === null) return;
      row[slot] = place;
      used.add(place);
      settle(turn + 1);
      used.delete(place);
      row[slot] = null;
    });
  }
  if (kinds.length > 0) settle(0);
  return best;
}
