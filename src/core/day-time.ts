import { tzOffset } from '@date-fns/tz';

/**
 * Club days and clocks. A day is 'YYYY-MM-DD' and day sums are calendar sums, free of zones. A clock is 'HH:MM', 24 h. An
 * instant is UTC milliseconds. Malformed text given to a function that needs a day or clock is a programming error and
 * throws a RangeError: check input with isDay, isClock and isZone first.
 */

const DAY_MS = 86_400_000;
const MINUTE_MS = 60_000;
const WEEKDAYS = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'] as const;
/** Months for people, January first. */
export const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const;

/** The day's number since 1970-01-01, or null when the text is no day of the calendar. */
function dayNumber(text: string): number | null {
  const match = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text);
  if (!match) return null;
  const ms = Date.parse(`${text}T00:00:00Z`);
  if (Number.isNaN(ms) || new Date(ms).toISOString().slice(0, 10) !== text) return null;
  return ms / DAY_MS;
}

function needDay(text: string): number {
  const n = dayNumber(text);
  if (n === null) throw new RangeError(`Not a day: ${text}`);
  return n;
}

function clockMinutes(text: string): number | null {
  const match = /^([01]\d|2[0-3]):([0-5]\d)$/.exec(text);
  return match ? Number(match[1]) * 60 + Number(match[2]) : null;
}

function dayText(n: number): string {
  return new Date(n * DAY_MS).toISOString().slice(0, 10);
}

function offsetMs(zone: string, at: number): number {
  const minutes = tzOffset(zone, new Date(at));
  if (Number.isNaN(minutes)) throw new RangeError(`Not a time zone: ${zone}`);
  return minutes * MINUTE_MS;
}

/** Whether text is a real day: '2024-02-29' is, '2023-02-29' is not. */
export function isDay(text: string): boolean {
  return dayNumber(text) !== null;
}

/** Whether text is a 24-hour clock 'HH:MM', 00:00 to 23:59. */
export function isClock(text: string): boolean {
  return clockMinutes(text) !== null;
}

/** Whether the runtime knows this IANA zone. */
export function isZone(zone: string): boolean {
  try {
    return new Intl.DateTimeFormat('en-US', { timeZone: zone }).resolvedOptions().timeZone !== '';
  } catch {
    return false;
  }
}

/** The day n days later (earlier when negative). */
export function addDays(day: string, n: number): string {
  return dayText(needDay(day) + n);
}

/** Days from a to b: 1 from a day to the next, negative when b is earlier. */
export function daysBetween(a: string, b: string): number {
  return needDay(b) - needDay(a);
}

/** 1 January is 1. */
export function dayOfYear(day: string): number {
  return daysBetween(`${day.slice(0, 4)}-01-01`, day) + 1;
}

/** The month of a day, 1-12. */
export function monthOf(day: string): number {
  return new Date(needDay(day) * DAY_MS).getUTCMonth() + 1;
}

/**
 * The instant a club's clock shows a time on a day. A time skipped when clocks go forward is moved on by what was skipped
 * (02:30 becomes 03:30); a time shown twice when they go back is the first.
 */
export function localToUtc(day: string, clock: string, zone: string): number {
  const minutes = clockMinutes(clock);
  if (minutes === null) throw new RangeError(`Not a clock time: ${clock}`);
  const naive = needDay(day) * DAY_MS + minutes * MINUTE_MS;
  const before = offsetMs(zone, naive - DAY_MS);
  const after = offsetMs(zone, naive + DAY_MS);
  const shown = [before, after].map((o) => naive - o).filter((at) => at + offsetMs(zone, at) === naive);
  return shown.length > 0 ? Math.min(...shown) : naive - before;
}

/** The club's day at an instant. */
export function dayOf(at: number, zone: string): string {
  return new Date(at + offsetMs(zone, at)).toISOString().slice(0, 10);
}

/** The club's clock at an instant, 24 h: '06:05'. Seconds are dropped. */
export function formatClock(at: number, zone: string): string {
  return new Date(at + offsetMs(zone, at)).toISOString().slice(11, 16);
}

/** The club's clock at an instant, 12 h: '6:05 AM'. */
export function formatClock12(at: number, zone: string): string {
  const clock = formatClock(at, zone);
  const hour = Number(clock.slice(0, 2));
  return `${hour % 12 || 12}:${clock.slice(3)} ${hour < 12 ? 'AM' : 'PM'}`;
}

/** A day for people: 'Sat 7 Nov', and with the year 'Sat 7 Nov 2026'. */
export function formatDay(day: string, withYear = false): string {
  const date = new Date(needDay(day) * DAY_MS);
  const text = `${WEEKDAYS[date.getUTCDay()]} ${date.getUTCDate()} ${MONTHS[date.getUTCMonth()]}`;
  return withYear ? `${text} ${day.slice(0, 4)}` : text;
}

/** The month of a day, for people: 'Nov'. */
export const formatMonth = (day: string): string => MONTHS[monthOf(day) - 1] ?? '';

/** An instant rounded to the whole minute, halves up, as printed almanacs do. */
export function roundToMinute(at: number): number {
  return Math.floor(at / MINUTE_MS + 0.5) * MINUTE_MS;
}
