import type { SitWindow } from '../condition-types';
import type { ApproachOption } from '../verdict-types';
import type { SunMarks } from '../whereabouts';
import type { ApproachSettings } from './approach-settings';

const MIN = 60_000;

export interface Entry {
  entry: ApproachOption['entry'];
  /** In the seat, UTC ms. */
  inBy: number;
}

/**
 * The times of going in that are worth trying, earliest first. Daybreak is civil dawn. Morning: in before light, 30 and 60 minutes after
 * daybreak, late in the morning; evening: midday and the window's start. Never later than half an hour before the window ends.
 */
export function entriesFor(window: SitWindow, sun: SunMarks, s: ApproachSettings): Entry[] {
  const last = window.endAt - 30 * MIN;
  const tries: Entry[] = [];
  if (window.window === 'morning') {
    const daybreak = sun.civilDawn ?? window.startAt;
    tries.push({ entry: 'before_light', inBy: Math.min(daybreak - s.beforeLightMinutes * MIN, window.startAt) });
    tries.push({ entry: 'after_daybreak_30', inBy: daybreak + 30 * MIN });
    tries.push({ entry: 'after_daybreak_60', inBy: daybreak + 60 * MIN });
    tries.push({ entry: 'midday', inBy: Math.max(daybreak + 150 * MIN, window.endAt - 90 * MIN) });
  } else {
    const noon = sun.rise !== null && sun.set !== null ? (sun.rise + sun.set) / 2 : window.startAt - 120 * MIN;
    if (noon + 30 * MIN < window.startAt - 15 * MIN) tries.push({ entry: 'midday', inBy: noon + 30 * MIN });
    tries.push({ entry: 'afternoon', inBy: window.startAt });
  }
  const kept = tries.filter((t) => t.inBy <= last);
  return (kept.length > 0 ? kept : tries.slice(0, 1)).map((t) => ({ ...t, inBy: Math.round(t.inBy / MIN) * MIN }));
}
