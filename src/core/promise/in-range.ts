import { turnDeg } from '../angles';
import { bearingDeg, distanceM, nearestOnShape } from '../geometry';
import type { ScoredFeature, ScoredStand, Weapon } from '../ground-types';
import type { PromiseSettings } from './promise-settings';

/** A bow shot of 30 yd: what a stand with no range written is taken to reach. Practice. */
const UNSTATED_RANGE_M = 27.4;

/** Longest shot in metres with a weapon; with none named, the longest the stand allows. */
export function shotRangeM(stand: ScoredStand, weapon: Weapon | null): number {
  const own = weapon === null ? undefined : stand.shotRangeM[weapon];
  if (own !== undefined && own > 0) return own;
  const allowed = Object.values(stand.shotRangeM).filter((m) => m > 0);
  return allowed.length > 0 ? Math.max(...allowed) : UNSTATED_RANGE_M;
}

/** 1 within range, falling to 0 at `wanderTimes` the range. */
export function inRangeShare(metres: number, rangeM: number, s: PromiseSettings): number {
  if (metres <= rangeM) return 1;
  return Math.max(0, 1 - (metres - rangeM) / (rangeM * (s.wanderTimes - 1)));
}

/** 1 on the side the sitter can shoot to (20 degrees of grace past straight ahead and straight behind), else the off-side factor. */
export function shotSideShare(stand: ScoredStand, bearing: number, s: PromiseSettings): number {
  if (stand.facingDeg === null || stand.shotSide === 'either') return 1;
  const turn = turnDeg(stand.facingDeg, bearing);
  const toShotSide = stand.shotSide === 'right' ? turn : -turn;
  return toShotSide >= -20 || toShotSide <= -160 ? 1 : s.offSideFactor;
}

export interface InRange {
  feature: number;
  /** 0-1: in range and on the shot side. */
  share: number;
  /** Direction of a travel line where it comes nearest, degrees; null for anything else. */
  lineDeg: number | null;
}

function lineDegNear(stand: ScoredStand, feature: ScoredFeature): number | null {
  if (feature.shape.type !== 'line') return null;
  if (feature.kind !== 'travel_line' && feature.kind !== 'crossing' && feature.kind !== 'rub_line') return null;
  let best: number | null = null;
  let bestM = Number.POSITIVE_INFINITY;
  const points = feature.shape.points;
  for (let i = 1; i < points.length; i++) {
    const a = points[i - 1];
    const b = points[i];
    if (!a || !b) continue;
    const d = distanceM(stand.at, nearestOnShape(stand.at, { type: 'line', points: [a, b] }));
    if (d < bestM) {
      bestM = d;
      best = bearingDeg(a, b);
    }
  }
  return best;
}

/** Features a shot may be had at from a stand: what does not depend on the hour. `feature` is the place in the list given. */
export function featuresInRange(
  stand: ScoredStand,
  features: ScoredFeature[],
  weapon: Weapon | null,
  s: PromiseSettings,
): InRange[] {
  const rangeM = shotRangeM(stand, weapon);
  const reachM = rangeM * s.wanderTimes;
  const found: InRange[] = [];
  features.forEach((feature, i) => {
    const nearest = nearestOnShape(stand.at, feature.shape);
    const metres = distanceM(stand.at, nearest);
    if (metres >= reachM) return;
    const side = metres < 5 ? 1 : shotSideShare(stand, bearingDeg(stand.at, nearest), s);
    found.push({ feature: i, share: inRangeShare(metres, rangeM, s) * side, lineDeg: lineDegNear(stand, feature) });
  });
  return found;
}
