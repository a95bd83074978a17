import type { Arc } from '@/core/ground-types';
import { round, shadePaths } from '@/ui/wind/strip-drawing';
import { unrollArcs } from '@/ui/wind/strip-shares';
import { MINI_STRIP } from './mini-strip-size';
import type { StripBar, StripShade } from './view-types';

/** An arc of a degree or two is still to be seen. */
const NARROWEST = 1.5;

const xOf = (deg: number) => (deg / 360) * MINI_STRIP.width;

/** Worked out once for all the stands that share a wind: a phone then draws the week without knowing how. `shares`: 72, sum 1. */
export function drawShades(shares: readonly number[]): StripShade[] {
  return shadePaths(shares, xOf, 0, MINI_STRIP.shade).map(({ opacity, d }) => ({ opacity, d }));
}

export function drawBars(arcs: readonly Arc[]): StripBar[] {
  return unrollArcs(arcs).map(({ from, to }) => ({
    x: round(xOf(from)),
    width: round(Math.max(NARROWEST, xOf(to) - xOf(from))),
  }));
}
