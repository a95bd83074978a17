import { turnDeg } from '../angles';
import { bearingDeg, distanceM, nearestOnShape, pointAt } from '../geometry';
import type { LocalShape, Point, ScoredApproach, ScoredFeature } from '../ground-types';
import type { ApproachSettings } from './approach-settings';
import { seenFalloff } from './seen-heard';
import { routeLengths, walkSeconds } from './walk-times';

/** A circle that holds a feature: a cheap way to leave out what is far. */
export interface FeatureCircle {
  centre: Point;
  radiusM: number;
  corners: Point[];
}

export function cornersOf(shape: LocalShape): Point[] {
  if (shape.type === 'point') return [shape.at];
  return shape.type === 'line' ? shape.points : (shape.rings[0] ?? []);
}

export function circleOf(feature: ScoredFeature): FeatureCircle {
  const corners = cornersOf(feature.shape);
  const n = Math.max(1, corners.length);
  const centre = {
    eastM: corners.reduce((sum, p) => sum + p.eastM, 0) / n,
    northM: corners.reduce((sum, p) => sum + p.northM, 0) / n,
  };
  return { centre, radiusM: corners.reduce((most, p) => Math.max(most, distanceM(centre, p)), 0), corners };
}

interface Source {
  at: Point;
  driven: boolean;
}

/** Points at most `spacingM` apart along a way in, its ends among them. */
export function sourcesAlong(approach: ScoredApproach, spacingM: number): Source[] {
  const first = approach.points[0];
  if (!first) return [];
  const sources: Source[] = [{ at: first, driven: approach.vehicleToIndex > 0 }];
  for (let i = 1; i < approach.points.length; i++) {
    const a = approach.points[i - 1];
    const b = approach.points[i];
    if (!a || !b) continue;
    const metres = distanceM(a, b);
    const parts = Math.min(200, Math.max(1, Math.ceil(metres / spacingM)));
    const bearing = bearingDeg(a, b);
    for (let k = 1; k <= parts; k++) {
      sources.push({
        at: k === parts ? b : pointAt(a, bearing, (metres * k) / parts),
        driven: i <= approach.vehicleToIndex,
      });
    }
  }
  return sources;
}

/** A feature as seen from one point of the walk: how far, and the span of bearings it fills. */
export interface Sight {
  metres: number;
  fromDeg: number;
  widthDeg: number;
  driven: boolean;
}

/** A feature near enough to a walk to matter. */
export interface WalkSlot {
  /** Place in the list of features. */
  feature: number;
  /** Most of the seen-and-heard falloff along the way, 0-1. */
  seen: number;
  sights: Sight[];
}

/** A way in against the ground: what does not depend on the hour. `tables` is filled as stability classes come up. */
export interface WalkGround {
  approach: ScoredApproach;
  seconds: number;
  walkedM: number;
  slots: WalkSlot[];
  tables: (Float32Array | null)[];
}

/** Nearer than this, a deer is at the walker's feet: bearings stop meaning anything. */
const AT_FEET_M = 10;

export function sightOf(source: Source, feature: ScoredFeature, circle: FeatureCircle): Sight {
  const nearest = nearestOnShape(source.at, feature.shape);
  const metres = distanceM(source.at, nearest);
  if (metres < AT_FEET_M) return { metres: AT_FEET_M, fromDeg: 0, widthDeg: 360, driven: source.driven };
  const bearing = bearingDeg(source.at, nearest);
  let left = 0;
  let right = 0;
  for (const corner of circle.corners) {
    const turn = turnDeg(bearing, bearingDeg(source.at, corner));
    if (turn < left) left = turn;
    if (turn > right) right = turn;
  }
  return { metres, fromDeg: bearing + left, widthDeg: right - left, driven: source.driven };
}

export function buildWalkGround(
  approach: ScoredApproach,
  features: ScoredFeature[],
  circles: FeatureCircle[],
  s: ApproachSettings,
): WalkGround {
  const sources = sourcesAlong(approach, s.spacingM);
  const reachM = Math.max(s.seenReachM, s.scentReachM);
  const slots: WalkSlot[] = [];
  features.forEach((feature, i) => {
    const circle = circles[i];
    if (!circle) return;
    let seen = 0;
    const sights: Sight[] = [];
    for (const source of sources) {
      if (distanceM(source.at, circle.centre) - circle.radiusM > reachM) continue;
      const sight = sightOf(source, feature, circle);
      if (sight.metres > reachM) continue;
      sights.push(sight);
      seen = Math.max(seen, seenFalloff(sight.metres, s) * (source.driven ? s.vehicleSeenFactor : 1));
    }
    if (sights.length > 0) slots.push({ feature: i, seen: Math.min(1, seen), sights });
  });
  const { walkedM } = routeLengths(approach);
  return { approach, seconds: walkSeconds(approach, s), walkedM, slots, tables: [null, null, null, null, null, null] };
}
