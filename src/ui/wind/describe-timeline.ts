import { TIMELINE_WORDS as WORDS } from '../words/wind';
import { percent } from './strip-shares';

/** The part of a sit's half hour that the timeline draws. Chances and shares 0-1; null: no forecast. */
export interface TimelineSpan {
  at: number;
  arcHold: number | null;
  windedChance: number | null;
  sunInEyes: boolean;
  precipMm: number | null;
  note?: string | null;
}

/** Rain too light to count as rain, mm in the step. */
const TRACE_MM = 0.1;

export function isWet(span: TimelineSpan): boolean {
  return span.precipMm !== null && span.precipMm >= TRACE_MM;
}

/** The timeline in a sentence: lowest hold, highest chance of being winded, sun and rain by clock. */
export function describeTimeline(spans: readonly TimelineSpan[], formatClock: (at: number) => string): string {
  const holds = spans.flatMap((span) => (span.arcHold === null ? [] : [{ at: span.at, value: span.arcHold }]));
  const winded = spans.flatMap((span) =>
    span.windedChance === null ? [] : [{ at: span.at, value: span.windedChance }],
  );
  const parts: string[] = [];
  const low = holds.reduce<(typeof holds)[number] | null>((a, b) => (a && a.value <= b.value ? a : b), null);
  const high = winded.reduce<(typeof winded)[number] | null>((a, b) => (a && a.value >= b.value ? a : b), null);
  const first = holds[0];
  if (low && first) {
    parts.push(WORDS.hold(percent(first.value), formatClock(first.at), percent(low.value), formatClock(low.at)));
  } else parts.push(WORDS.noForecast);
  if (high) parts.push(WORDS.winded(percent(high.value), formatClock(high.at)));
  const sun = spans.filter((span) => span.sunInEyes).map((span) => formatClock(span.at));
  if (sun.length > 0) parts.push(WORDS.sun(sun.join(', ')));
  const wet = spans.filter(isWet).map((span) => formatClock(span.at));
  if (wet.length > 0) parts.push(WORDS.rain(wet.join(', ')));
  return parts.join('; ');
}

/** Points of the winded-chance line in a box of one unit a step and 100 high; gaps where there is no forecast. */
export function windedLine(spans: readonly TimelineSpan[]): string {
  let d = '';
  let pen = 'M';
  spans.forEach((span, step) => {
    if (span.windedChance === null) {
      pen = 'M';
      return;
    }
    d += `${pen}${step + 0.5} ${Math.round((1 - span.windedChance) * 1000) / 10}`;
    pen = 'L';
  });
  return d;
}
