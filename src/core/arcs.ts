import { normalizeDeg } from './angles';
import type { WindowName } from './condition-types';
import type { Arc, GoodWindArc } from './ground-types';
import { SECTOR_NAMES, SECTOR_WIDTH_DEG, sectorOf } from './sectors';

export const FULL_CIRCLE: Arc = { fromDeg: 0, toDeg: 360 };

/** Two directions this close are the same one: below any rounding in sums of degrees. */
const SAME_DEG = 1e-9;

/** Clockwise width of an arc in degrees, 0-360. */
export function arcWidthDeg(arc: Arc): number {
  if (arc.toDeg - arc.fromDeg >= 360) return 360;
  return normalizeDeg(arc.toDeg - arc.fromDeg);
}

/** Whether a direction lies in an arc; both ends are in it. */
export function arcContains(arc: Arc, deg: number): boolean {
  const past = normalizeDeg(deg - arc.fromDeg);
  return past <= arcWidthDeg(arc) + SAME_DEG || past >= 360 - SAME_DEG;
}

/** Whether a direction lies in any of the arcs; false for none. */
export function anyArcContains(arcs: readonly Arc[], deg: number): boolean {
  return arcs.some((arc) => arcContains(arc, deg));
}

/** A stand's arcs that count in a window. */
export function arcsFor(arcs: readonly GoodWindArc[], window: WindowName): Arc[] {
  return arcs
    .filter((arc) => arc.window === null || arc.window === window)
    .map(({ fromDeg, toDeg }) => ({ fromDeg, toDeg }));
}

/** The union of arcs as arcs that share no width, in order of where they begin, so that shares of wind may be summed over them. */
export function mergeArcs(arcs: readonly Arc[]): Arc[] {
  const spans = arcs
    .map((arc) => ({ from: normalizeDeg(arc.fromDeg), width: arcWidthDeg(arc) }))
    .map(({ from, width }) => ({ from, to: from + width }))
    .sort((a, b) => a.from - b.from || a.to - b.to);
  const merged: { from: number; to: number }[] = [];
  for (const span of spans) {
    const last = merged.at(-1);
    if (last && span.from <= last.to + SAME_DEG) last.to = Math.max(last.to, span.to);
    else merged.push({ ...span });
  }
  // Spans that run on past north may reach the first ones.
  while (merged.length > 1) {
    const first = merged[0];
    const last = merged.at(-1);
    if (!first || !last || last.to < first.from + 360 - SAME_DEG) break;
    last.to = Math.max(last.to, first.to + 360);
    merged.shift();
  }
  if (merged.some((span) => span.to - span.from >= 360 - SAME_DEG)) return [FULL_CIRCLE];
  return merged
    .map((span) => ({ fromDeg: span.from, toDeg: normalizeDeg(span.to) }))
    .sort((a, b) => a.fromDeg - b.fromDeg);
}

/** Sum of widths of a union of arcs, 0-360. */
export function coveredDeg(arcs: readonly Arc[]): number {
  return mergeArcs(arcs).reduce((sum, arc) => sum + arcWidthDeg(arc), 0);
}

/** An arc as compass points alone: 'NW-N', 'W', 'any'. */
export function compassSpan(arc: Arc): string {
  const width = arcWidthDeg(arc);
  if (width === 360) return 'any';
  const first = sectorOf(arc.fromDeg);
  // The far end belongs to the sector it closes, not to the one it would begin.
  const last = width < SAME_DEG ? first : sectorOf(arc.toDeg - Math.min(SAME_DEG * 10, width));
  const from = SECTOR_NAMES[first] ?? 'N';
  const to = SECTOR_NAMES[last] ?? 'N';
  return first === last && width <= SECTOR_WIDTH_DEG ? from : `${from}-${to}`;
}

function wholeDeg(deg: number): string {
  return `${Math.round(deg) + 0}°`;
}

/** An arc for people, as compass points and as degrees: 'NW-N · 304°–11°'. */
export function formatArc(arc: Arc): string {
  return `${compassSpan(arc)} · ${wholeDeg(arc.fromDeg)}–${wholeDeg(arc.toDeg)}`;
}
