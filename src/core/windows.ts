import type { ClubRules } from './booking/rules';
import { type SitWindow, WINDOW_NAMES, type WindowName } from './condition-types';
import { addDays, dayOf, localToUtc } from './day-time';
import { daylight, type Place } from './sun';

const MINUTE_MS = 60_000;

/** A window is never shorter than this, however short or late the daylight. */
const SHORTEST_MS = 60 * MINUTE_MS;

/** Clock times that stand for the sun where it does not rise or does not set. */
const POLAR_RISE = '06:00';
const POLAR_SET = '20:00';

type WindowRules = Pick<ClubRules, 'windowHours'>;

/** The start and end of a window on a club day, by the club's window hours and the sun. */
export function sitWindow(day: string, window: WindowName, rules: WindowRules, place: Place): SitWindow {
  const sun = daylight(day, place);
  if (window === 'morning') {
    const { startMinutesFromSunrise, endClock } = rules.windowHours.morning;
    const rise = sun?.rise ?? localToUtc(day, POLAR_RISE, place.zone);
    const startAt = rise + startMinutesFromSunrise * MINUTE_MS;
    return { day, window, startAt, endAt: Math.max(localToUtc(day, endClock, place.zone), startAt + SHORTEST_MS) };
  }
  const { startClock, endMinutesFromSunset } = rules.windowHours.evening;
  const set = sun?.set ?? localToUtc(day, POLAR_SET, place.zone);
  const endAt = set + endMinutesFromSunset * MINUTE_MS;
  return { day, window, startAt: Math.min(localToUtc(day, startClock, place.zone), endAt - SHORTEST_MS), endAt };
}

/** Both windows of a day: what an all-day sit holds. */
export function allDayWindows(day: string, rules: WindowRules, place: Place): SitWindow[] {
  return WINDOW_NAMES.map((window) => sitWindow(day, window, rules, place));
}

/** The window going on now, or else the next to begin. */
export function nextWindow(now: number, rules: WindowRules, place: Place): SitWindow {
  const today = dayOf(now, place.zone);
  // Yesterday's evening may end after midnight in a northern summer; two days ahead there is always one to come.
  for (const offset of [-1, 0, 1]) {
    const open = allDayWindows(addDays(today, offset), rules, place).find((w) => w.endAt > now);
    if (open) return open;
  }
  return sitWindow(addDays(today, 2), 'morning', rules, place);
}

/** The windows from one that is given on, in order, `count` of them. */
export function windowsFrom(first: SitWindow, count: number, rules: WindowRules, place: Place): SitWindow[] {
  const list: SitWindow[] = [];
  for (let day = first.day; list.length < count; day = addDays(day, 1)) {
    for (const w of allDayWindows(day, rules, place)) {
      const before = day === first.day && first.window === 'evening' && w.window === 'morning';
      if (!before && list.length < count) list.push(w);
    }
  }
  return list;
}
