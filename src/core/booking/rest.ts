import { addDays, daysBetween, formatDay } from '../day-time';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import type { OtherSit } from './booking-types';

/**
 * Rest is counted in full days after the day of a sit: a sit on Saturday the 7th with 3 rest days leaves the stand resting
 * on the 8th, 9th and 10th and ready on the 11th. Any number of sits on one day are one day's disturbance.
 */
function restsBetween(a: string, b: string, restDays: number): boolean {
  const apart = Math.abs(daysBetween(a, b));
  return apart > 0 && apart <= restDays;
}

/** The first day on or after `day` that breaks no rest of the days sat, before it or after it; a day sat anyway may be it. */
export function firstRestedDay(input: { restDays: number; sitDays: readonly string[]; day: string }): string {
  let day = input.day;
  while (input.sitDays.some((sat) => restsBetween(sat, day, input.restDays))) day = addDays(day, 1);
  return day;
}

/** The last day on which the stand still rests from earlier sits, as seen from `day`; null when it is ready on that day. */
export function restingUntil(input: { restDays: number; sitDays: readonly string[]; day: string }): string | null {
  const last = input.sitDays
    .filter((sat) => sat < input.day)
    .sort()
    .at(-1);
  if (last === undefined || !restsBetween(last, input.day, input.restDays)) return null;
  return addDays(last, input.restDays);
}

/** Rest both ways: the day may not fall in the rest of an earlier sit, nor put a later one into its own. */
export function restGates(input: {
  standName: string;
  restDays: number;
  day: string;
  sits: readonly Pick<OtherSit, 'day' | 'memberName'>[];
}): Gate[] {
  const { standName, restDays, day, sits } = input;
  const clashing = sits
    .filter((sit) => restsBetween(sit.day, day, restDays))
    .sort((a, b) => a.day.localeCompare(b.day) || a.memberName.localeCompare(b.memberName));
  if (clashing.length === 0) return [];
  const endsOn = firstRestedDay({ restDays, sitDays: sits.map((sit) => sit.day), day });
  const gates: Gate[] = [];
  const earlier = clashing.filter((sit) => sit.day < day).at(-1);
  if (earlier) {
    const through = formatDay(addDays(earlier.day, restDays));
    const text = GATE_WORDS.resting({
      stand: standName,
      member: earlier.memberName,
      day: formatDay(earlier.day),
      restDays,
      through,
    });
    gates.push({ code: 'resting', text, endsOn });
  }
  const later = clashing.find((sit) => sit.day > day);
  if (later) {
    const text = GATE_WORDS.breaksRest({
      stand: standName,
      member: later.memberName,
      day: formatDay(later.day),
      restDays,
      asked: formatDay(day),
    });
    gates.push({ code: 'breaks_later_rest', text, endsOn });
  }
  return gates;
}
