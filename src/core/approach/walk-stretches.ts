import { distanceM } from '../geometry';
import type { Point, ScoredApproach, ScoredFeature } from '../ground-types';
import type { WalkContext } from './try-ways';
import { walkChance } from './walk-chance';
import { buildWalkGround, circleOf, sourcesAlong } from './walk-ground';
import { walkTable } from './walk-scent';

/** A short piece of a way and what standing in it would cost. */
export interface WalkStretch {
  from: Point;
  to: Point;
  /** From the start of the way to the start of this piece, metres. */
  startM: number;
  lengthM: number;
  driven: boolean;
  /** Chance (0-1) that deer are alerted from the worse of its ends, the rest of the way left out. */
  chance: number;
  /** Index of the feature that costs most there; null when none is touched. */
  worst: number | null;
}

/**
 * A way cut into pieces no longer than the settings' spacing, each with the chance of alerting deer from it at an instant (UTC ms).
 * The same sums as for the whole walk, a point at a time: the walk's own chance is never less than that of its worst piece.
 */
export function walkStretches(
  approach: ScoredApproach,
  features: ScoredFeature[],
  at: number,
  context: WalkContext,
): WalkStretch[] {
  const { settings, plumes } = context;
  const circles = features.map(circleOf);
  const wind = context.windAt(at);
  const { dark, shares } = context.frame.momentAt(at);
  const points = sourcesAlong(approach, settings.spacingM).map((source) => {
    const standing = { ...approach, points: [source.at], vehicleToIndex: source.driven ? 1 : 0 };
    const ground = buildWalkGround(standing, features, circles, settings);
    const table = wind ? walkTable(ground, wind.stability, plumes) : null;
    return { ...source, ...walkChance(ground, table, { dark, shares, wind }, settings) };
  });
  let startM = 0;
  return points.slice(1).flatMap((to, i): WalkStretch[] => {
    const from = points[i];
    if (!from) return [];
    const lengthM = distanceM(from.at, to.at);
    const worse = from.chance > to.chance ? from : to;
    const stretch: WalkStretch = {
      from: from.at,
      to: to.at,
      startM,
      lengthM,
      driven: to.driven,
      chance: worse.chance,
      worst: worse.worst?.feature ?? null,
    };
    startM += lengthM;
    return [stretch];
  });
}
