import { huntingYear } from '@/core/booking/hunting-year';

/** The middle of each month hunted, September to January, of the season that a day lies in. */
export function seasonDays(today: string): string[] {
  const year = Number(huntingYear(today).fromDay.slice(0, 4));
  return [9, 10, 11, 12, 1].map((month) => `${month === 1 ? year + 1 : year}-${String(month).padStart(2, '0')}-15`);
}
