import type { ApproachSettings } from './approach-settings';

/** Share (0-1) left at a distance: strong within 100 m, nothing at the reach. */
export function seenFalloff(metres: number, s: ApproachSettings): number {
  if (metres >= s.seenReachM) return 0;
  const near = 1 - Math.max(0, metres) / s.seenReachM;
  return near * near;
}

/**
 * Factor on the chance at no distance for the light and the wind: darkness takes from sight, wind from hearing, neither takes all.
 * `dark` is 0 (day) to 1 (night); unknown wind masks nothing.
 */
export function senseFactor(dark: number, windSpeedMps: number | null, s: ApproachSettings): number {
  const sight = (1 - s.heardShare) * (1 - dark * (1 - s.darkFactor));
  const masked = s.maskMost * Math.min(1, Math.max(0, windSpeedMps ?? 0) / s.maskSpeedMps);
  return sight + s.heardShare * (1 - masked);
}

/** Chance (0-1) that a deer at this distance notices a person walking by. */
export function seenHeardChance(
  metres: number,
  dark: number,
  windSpeedMps: number | null,
  s: ApproachSettings,
): number {
  return s.seenNearChance * seenFalloff(metres, s) * senseFactor(dark, windSpeedMps, s);
}
