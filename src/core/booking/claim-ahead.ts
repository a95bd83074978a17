import type { SitWindow } from '../condition-types';
import { addDays, dayOf, daysBetween, formatClock, formatDay } from '../day-time';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import type { ClaimAhead } from './rules';

const HOUR_MS = 3_600_000;

/** A window that has ended cannot be booked; one that has begun only where the club has walk-up sits. */
export function windowOverGates(spans: readonly SitWindow[], now: number, walkUpSits: boolean, zone: string): Gate[] {
  return spans.flatMap((span): Gate[] => {
    if (span.endAt <= now) {
      const text = GATE_WORDS.windowOver(span.window, formatDay(span.day), formatClock(span.endAt, zone));
      return [{ code: 'window_over', text, endsOn: null }];
    }
    if (span.startAt <= now && !walkUpSits) {
      const text = GATE_WORDS.noWalkUp(span.window, formatDay(span.day), formatClock(span.startAt, zone));
      return [{ code: 'window_over', text, endsOn: null }];
    }
    return [];
  });
}

/** How far ahead the club lets a member claim: so many days, or only so many hours before the window's start. */
export function claimAheadGates(input: {
  rule: ClaimAhead;
  day: string;
  spans: readonly SitWindow[];
  now: number;
  zone: string;
}): Gate[] {
  const { rule, day, spans, now, zone } = input;
  if (rule.kind === 'days') {
    if (daysBetween(dayOf(now, zone), day) <= rule.days) return [];
    const opensOn = addDays(day, -rule.days);
    const text = GATE_WORDS.daysAhead(rule.days, formatDay(day), formatDay(opensOn));
    return [{ code: 'too_far_ahead', text, endsOn: opensOn }];
  }
  return spans
    .filter((span) => span.startAt - now > rule.hours * HOUR_MS)
    .map((span): Gate => {
      const opensAt = span.startAt - rule.hours * HOUR_MS;
      const text = GATE_WORDS.huntTime({
        hours: rule.hours,
        window: span.window,
        day: formatDay(span.day),
        opensDay: formatDay(dayOf(opensAt, zone)),
        opensAt: formatClock(opensAt, zone),
      });
      return { code: 'too_far_ahead', text, endsOn: new Date(opensAt).toISOString() };
    });
}
