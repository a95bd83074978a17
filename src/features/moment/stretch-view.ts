import type { Position } from 'geojson';
import type { WalkStretch } from '@/core/approach/walk-stretches';
import { fromLocal, type LatLon } from '@/core/geometry';
import type { Point } from '@/core/ground-types';
import type { StretchView } from './moment-types';

export function positionOf(centre: LatLon, p: Point): Position {
  const { lat, lon } = fromLocal(centre, p);
  return [lon, lat];
}

export function stretchView(
  stretch: WalkStretch,
  place: (p: Point) => Position,
  features: readonly { name: string }[],
): StretchView {
  return {
    from: place(stretch.from),
    to: place(stretch.to),
    startM: stretch.startM,
    endM: stretch.startM + stretch.lengthM,
    chance: stretch.chance,
    driven: stretch.driven,
    worst: stretch.worst === null ? null : (features[stretch.worst]?.name ?? null),
  };
}

/** Less than this is a walk like any other. */
const COSTLY = 0.02;

export interface CostlyRun {
  startM: number;
  endM: number;
  chance: number;
  worst: string | null;
}

/** The costly pieces of a walk, those that follow one another for the same reason as one; the worst first. */
export function costlyRuns(stretches: readonly StretchView[]): CostlyRun[] {
  const runs: CostlyRun[] = [];
  for (const { startM, endM, chance, worst } of stretches) {
    if (chance < COSTLY) continue;
    const last = runs.at(-1);
    if (last && last.worst === worst && Math.abs(last.endM - startM) < 0.5) {
      last.endM = endM;
      last.chance = Math.max(last.chance, chance);
    } else runs.push({ startM, endM, chance, worst });
  }
  return runs.toSorted((a, b) => b.chance - a.chance);
}

/** How thick a piece is drawn: 0 for the least, 1 for a coin's toss of alerting deer or worse. */
export function weightOf(chance: number): number {
  return Math.sqrt(Math.min(1, Math.max(0, chance) / 0.5));
}
