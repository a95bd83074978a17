export interface ScoreSettings {
  /** Exponents on promise and quiet; quiet must weigh more (see README: a poor stand that alerts nobody is worth more). */
  promisePower: number;
  quietPower: number;
  /** Share of quiet lost by a sit whose wind is never in the steward's good arcs. */
  arcCost: number;
  /** A forecast older than this is called stale, hours. */
  staleHours: number;
  /** Direction spread in degrees up to which confidence is high and fair. */
  highSpreadDeg: number;
  fairSpreadDeg: number;
  /** Lead in hours up to which confidence is high and fair. */
  highLeadHours: number;
  fairLeadHours: number;
}

/** All our choice; what matters is that quietPower is the greater. */
export const DEFAULT_SCORE: ScoreSettings = {
  promisePower: 0.5,
  quietPower: 1,
  arcCost: 0.4,
  staleHours: 12,
  highSpreadDeg: 32,
  fairSpreadDeg: 60,
  highLeadHours: 24,
  fairLeadHours: 72,
};

/** Sit score 0-100 from quiet and promise of 0-1. */
export function sitScore(quiet: number, promise: number, s: ScoreSettings): number {
  const q = Math.min(1, Math.max(0, quiet));
  const p = Math.min(1, Math.max(0, promise));
  return 100 * p ** s.promisePower * q ** s.quietPower;
}
