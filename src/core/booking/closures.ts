import { addDays, formatDay } from '../day-time';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import type { BookingStand } from './booking-types';
import type { ClosedDays } from './rules';

interface Span {
  fromDay: string;
  toDay: string | null;
  reason: string;
}

function covers(span: Span, day: string): boolean {
  return span.fromDay <= day && (span.toDay === null || day <= span.toDay);
}

/** First day from `day` on that no span covers; null when one has no end. */
function openAgainOn(spans: readonly Span[], day: string): string | null {
  let open = day;
  for (let span = spans.find((s) => covers(s, open)); span; span = spans.find((s) => covers(s, open))) {
    if (span.toDay === null) return null;
    open = addDays(span.toDay, 1);
  }
  return open;
}

function closedGates(code: 'closed' | 'closed_day', what: string, spans: readonly Span[], day: string): Gate[] {
  const span = spans.find((s) => covers(s, day));
  if (!span) return [];
  const endsOn = openAgainOn(spans, day);
  const until = endsOn === null ? null : formatDay(addDays(endsOn, -1));
  return [{ code, text: GATE_WORDS.closed(what, until, span.reason.trim()), endsOn }];
}

/** Closures of the stand that cover the day. */
export function standClosureGates(stand: Pick<BookingStand, 'name' | 'closures'>, day: string): Gate[] {
  return closedGates('closed', stand.name, stand.closures, day);
}

/** Days on which the whole ground is closed. */
export function closedDayGates(closedDays: readonly ClosedDays[], day: string): Gate[] {
  return closedGates('closed_day', GATE_WORDS.ground, closedDays, day);
}
