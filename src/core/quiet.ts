import type { ScoreSettings } from './score';

/** Chances (0-1) that nothing is given away, part by part, and the exponent pressure puts on them. */
export interface QuietFactors {
  seat: number;
  arc: number;
  walkIn: number;
  walkOut: number;
  /** 1 or more. */
  pressurePower: number;
  /** Share (-1 to 1) the club's own log adds for the stand, once an admin has applied it; left out: none. */
  learned?: number;
}

/**
 * Factor for the steward's own winds: a sit whose wind is never in a good arc loses `arcCost` of its quiet. `share` is the
 * share of the sit in good arcs; null (none set for the window) says nothing and costs nothing.
 */
export function arcFactor(share: number | null, s: ScoreSettings): number {
  return share === null ? 1 : 1 - s.arcCost * (1 - share);
}

/** Quiet, 0-1. */
export function quietOf(f: QuietFactors): number {
  const q = (f.seat * f.arc * f.walkIn * f.walkOut) ** f.pressurePower;
  return Math.min(1, Math.max(0, q + (f.learned ?? 0)));
}
