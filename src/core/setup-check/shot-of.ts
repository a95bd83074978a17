import { apartDeg, downwindDeg } from '../angles';
import { anyArcContains, arcsFor } from '../arcs';
import { WINDOW_NAMES, type WindowName } from '../condition-types';
import { bearingDeg, distanceM, distanceToShapeM, lengthM, nearestOnShape } from '../geometry';
import type { FeatureKind, LocalShape, Point, ScoredApproach, ScoredFeature, ScoredStand } from '../ground-types';
import type { GroundWork } from '../ground-work';
import { shotRangeM, shotSideShare } from '../promise/in-range';
import type { SetupInput } from './setup-types';

/** What draws deer to itself. */
const ATTRACTIONS: ReadonlySet<FeatureKind> = new Set(['food_plot', 'crop', 'mast', 'water', 'scrape']);
const LINES: ReadonlySet<FeatureKind> = new Set(['travel_line', 'crossing', 'rub_line']);
const BEDS: ReadonlySet<FeatureKind> = new Set(['bedding', 'sanctuary']);

/** A creek drawn as a line is met all along it and can be moved by nobody. */
export const isAttraction = (f: ScoredFeature) =>
  ATTRACTIONS.has(f.kind) && !(f.kind === 'water' && f.shape.type === 'line');
/** What a club can take up and put elsewhere: a scrape it laid, a hole it dug or filled. An oak, a field and a pond stay where they are. */
export const isMovable = (f: ScoredFeature) => f.kind === 'scrape' || (f.kind === 'water' && f.shape.type === 'point');
/** The kind of work it is to lay, move or take away a place deer come to. */
export function workOn(f: ScoredFeature): GroundWork | null {
  if (f.kind === 'scrape') return 'mock_scrape';
  if (f.kind === 'water') return 'water';
  return f.kind === 'food_plot' ? 'planting' : null;
}
/** What a club made for deer to come to. */
export const isMade = (f: ScoredFeature) => isMovable(f) || f.kind === 'food_plot';
export const isLine = (f: ScoredFeature) => LINES.has(f.kind);
export const isBed = (f: ScoredFeature) => BEDS.has(f.kind);

export interface Shot {
  metres: number;
  bearing: number;
  nearest: Point;
  inRange: boolean;
  side: 'fine' | 'off' | 'behind';
}

/** How a place lies to a seat. */
export function shotOf(
  stand: ScoredStand,
  shape: LocalShape,
  { settings, scoring }: Pick<SetupInput, 'settings' | 'scoring'>,
): Shot {
  const nearest = nearestOnShape(stand.at, shape);
  const metres = distanceM(stand.at, nearest);
  const bearing = bearingDeg(stand.at, nearest);
  const behind = stand.facingDeg !== null && apartDeg(stand.facingDeg, bearing) > settings.behindDeg;
  const off = shotSideShare(stand, bearing, scoring.promise) < 1;
  const side = metres < 5 ? 'fine' : behind ? 'behind' : off ? 'off' : 'fine';
  return { metres, bearing, nearest, inRange: metres <= shotRangeM(stand, null), side };
}

export const canShoot = (shot: Shot) => shot.inRange && shot.side === 'fine';

export const windowsHunted = (stand: ScoredStand): WindowName[] =>
  WINDOW_NAMES.filter((w) => stand.suitability[w] !== 'avoid');

/** Compass points (0-15) a stand is hunted on in a window: all of them when it has no arcs. */
export function windsHunted(stand: ScoredStand, window: WindowName): number[] {
  const arcs = arcsFor(stand.arcs, window);
  const points = Array.from({ length: 16 }, (_, i) => i);
  if (arcs.length === 0) return points;
  const inArcs = points.filter((i) => anyArcContains(arcs, i * 22.5));
  return inArcs.length > 0 ? inArcs : [Math.round((arcs[0]?.fromDeg ?? 0) / 22.5) % 16];
}

/** Whether a wind carries scent from a place toward a bearing. */
export function carries(windFromDeg: number, bearing: number, withinDeg: number): boolean {
  return apartDeg(downwindDeg(windFromDeg), bearing) <= withinDeg;
}

/** Points along a line no farther apart than a step. */
export function along(points: Point[], stepM: number): Point[] {
  const out: Point[] = [];
  for (let i = 1; i < points.length; i++) {
    const [a, b] = [points[i - 1] as Point, points[i] as Point];
    const parts = Math.max(1, Math.ceil(distanceM(a, b) / stepM));
    for (let k = i === 1 ? 0 : 1; k <= parts; k++) {
      const share = k / parts;
      out.push({ eastM: a.eastM + (b.eastM - a.eastM) * share, northM: a.northM + (b.northM - a.northM) * share });
    }
  }
  return out.length > 0 ? out : points.slice(0, 1);
}

/** The part of a way that is walked, without its last metres before the seat. */
export function footPath(approach: ScoredApproach, seatMarginM: number): Point[] {
  const walked = along(approach.points.slice(approach.vehicleToIndex), 10);
  const total = lengthM(walked);
  let gone = 0;
  return walked.filter((p, i) => {
    if (i > 0) gone += distanceM(walked[i - 1] as Point, p);
    return total - gone >= seatMarginM;
  });
}

function boxOf(points: Point[]) {
  const [east, north] = [points.map((p) => p.eastM), points.map((p) => p.northM)];
  return {
    west: Math.min(...east),
    east: Math.max(...east),
    south: Math.min(...north),
    north: Math.max(...north),
  };
}

/** Asks whether a shape may come within so many metres of a path: false is sure, true is worth measuring. */
export function nearness(path: Point[]): (shape: LocalShape, withinM: number) => boolean {
  const a = boxOf(path);
  return (shape, withinM) => {
    const points = shape.type === 'point' ? [shape.at] : shape.type === 'line' ? shape.points : (shape.rings[0] ?? []);
    const b = boxOf(points);
    const [across, up] = [Math.max(a.west - b.east, b.west - a.east), Math.max(a.south - b.north, b.south - a.north)];
    return across <= withinM && up <= withinM;
  };
}

/** Least distance between a shape and a line of movement, to about 5 m. */
export function gapM(shape: LocalShape, line: LocalShape): number {
  const points =
    line.type === 'point' ? [line.at] : along(line.type === 'line' ? line.points : (line.rings[0] ?? []), 5);
  return Math.min(Number.POSITIVE_INFINITY, ...points.map((p) => distanceToShapeM(p, shape)));
}

export const standOf = (input: Pick<SetupInput, 'stands'>, id: string) => input.stands.find((s) => s.id === id) ?? null;
