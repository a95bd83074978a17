import { addDays, daysBetween } from '../day-time';

/** Seven days from a Monday, so that a weekend's sits stand together. Both days are in the week. */
export interface Week {
  fromDay: string;
  toDay: string;
}

const A_MONDAY = '1970-01-05';

function mondayOf(day: string): string {
  const past = daysBetween(A_MONDAY, day) % 7;
  return addDays(day, -(past < 0 ? past + 7 : past));
}

/** The weeks that hold two days and all between; none when the first lies after the last. */
export function weeksBetween(fromDay: string, toDay: string): Week[] {
  const weeks: Week[] = [];
  for (let day = mondayOf(fromDay); day <= toDay && fromDay <= toDay; day = addDays(day, 7)) {
    weeks.push({ fromDay: day, toDay: addDays(day, 6) });
  }
  return weeks;
}
