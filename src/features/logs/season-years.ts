import { huntingYear } from '@/core/booking/hunting-year';

/** A hunting year, 1 July to 30 June, by the calendar year in which it begins. */
export interface SeasonYear {
  year: number;
  /** '2026-27' */
  label: string;
  fromDay: string;
  toDay: string;
}

export function seasonYear(year: number): SeasonYear {
  const { fromDay, toDay } = huntingYear(`${year}-07-01`);
  return { year, label: `${year}-${String((year + 1) % 100).padStart(2, '0')}`, fromDay, toDay };
}

/** The calendar year in which the hunting year of a day begins. */
export function yearOf(day: string): number {
  return Number(huntingYear(day).fromDay.slice(0, 4));
}

/** From the year of today back to that of the first record, the latest first. */
export function seasonYears(today: string, firstDay: string | null): SeasonYear[] {
  const last = yearOf(today);
  const first = Math.min(last, firstDay === null ? last : yearOf(firstDay));
  return Array.from({ length: last - first + 1 }, (_, n) => seasonYear(last - n));
}
