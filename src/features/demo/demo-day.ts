import { addDays, localToUtc } from '@/core/day-time';
import { DEMO_PLACE } from './demo-place';
import type { Dice } from './dice';

/** The day the demo is made on: everything in it is so many days before or after. */
export interface DemoDay {
  today: string;
  dice: Dice;
}

export function daysFrom({ today }: DemoDay, n: number): string {
  return addDays(today, n);
}

/** An instant so many days from today, at a club clock time. */
export function momentOf({ today }: DemoDay, n: number, clock: string): number {
  return localToUtc(addDays(today, n), clock, DEMO_PLACE.zone);
}
