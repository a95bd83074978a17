import { addDays, dayOf, daysBetween, formatClock, formatDay } from '../day-time';
import type { Gate, SitWindow } from '../types';
import type { ClaimAhead } from './rules';

const HOUR_MS = 3_600_000;

function counted(n: number, one: string): string {
  return `${n} ${one}${n === 1 ? '' : 's'}`;
}

/** A window that has ended cannot be booked; one that has begun only where the club has walk-up sits. */
export function windowOverGates(spans: readonly SitWindow[], now: number, walkUpSits: boolean, zone: string): Gate[] {
  return spans.flatMap((span): Gate[] => {
    if (span.endAt <= now) {
      const text = `The ${span.window} of ${formatDay(span.day)} ended at ${formatClock(span.endAt, zone)}.`;
      return [{ code: 'window_over', text, endsOn: null }];
    }
    if (span.startAt <= now && !walkUpSits) {
      const text = `The ${span.window} of ${formatDay(span.day)} began at ${formatClock(span.startAt, zone)}, and the club has no walk-up sits.`;
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
    const text = `Claims are taken ${counted(rule.days, 'day')} ahead: ${formatDay(day)} opens on ${formatDay(opensOn)}.`;
    return [{ code: 'too_far_ahead', text, endsOn: opensOn }];
  }
  return spans
    .filter((span) => span.startAt - now > rule.hours * HOUR_MS)
    .map((span): Gate => {
      const opensAt = span.startAt - rule.hours * HOUR_MS;
      const opens = `${formatDay(dayOf(opensAt, zone))} at ${formatClock(opensAt, zone)}`;
      const text = `Claims are taken only at the time of the hunt, ${counted(rule.hours, 'hour')} ahead: the ${span.window} of ${formatDay(span.day)} opens on ${opens}.`;
      return { code: 'too_far_ahead', text, endsOn: new Date(opensAt).toISOString() };
    });
}
