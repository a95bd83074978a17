import { isDay } from '@/core/day-time';

/** Days a list may be asked for. */
export function inAskedYears(day: string): boolean {
  return isDay(day) && day >= '2000-01-01' && day <= '2099-12-31';
}
