import { addDays, dayOf, formatClock, localToUtc } from '../day-time';
import type { NoticeChoices } from './notice-kinds';

type Quiet = Pick<NoticeChoices, 'quietFrom' | 'quietTo'>;

/** Whether a clock 'HH:MM' lies in the quiet hours; equal ends mean there are none. */
export function isQuiet(clock: string, { quietFrom, quietTo }: Quiet): boolean {
  if (quietFrom === quietTo) return false;
  if (quietFrom < quietTo) return clock >= quietFrom && clock < quietTo;
  return clock >= quietFrom || clock < quietTo;
}

/** The first instant from `at` on (UTC ms) that is not in the quiet hours by the club's clock. */
export function afterQuiet(at: number, quiet: Quiet, zone: string): number {
  const clock = formatClock(at, zone);
  if (!isQuiet(clock, quiet)) return at;
  const today = dayOf(at, zone);
  const ends = quiet.quietTo > clock ? today : addDays(today, 1);
  return Math.max(at, localToUtc(ends, quiet.quietTo, zone));
}
