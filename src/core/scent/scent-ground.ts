import type { StabilityClass } from '../air/stability-types';
import { stabilityIndex } from '../air/stability-types';
import { normalizeDeg } from '../angles';
import type { LocalShape, Point } from '../ground-types';
import type { ScentSettings } from '../settings';
import { type PlumeTable, plumeTable, WIDENINGS_DEG } from './plume-table';
import { type SampledFeature, sampleFeature } from './sample-feature';
import { referenceStrength } from './saturate';
import { type TableScratch, tableScratch } from './table-scratch';

/** Beyond this a feature is sampled coarsely: a plume is wider there than the fine spacing. m. */
const FAR_M = 300;
const FAR_SPACING = 2.5;
const DEG = 180 / Math.PI;

/** What of a club's features scent needs, made once for all stands and hours. Feature indices are the caller's. */
export interface ScentGround {
  settings: ScentSettings;
  featureCount: number;
  near: SampledFeature[];
  far: SampledFeature[];
  plumes: Map<string, PlumeTable>;
  reference: number;
  scratch: TableScratch;
}

export function scentGround(features: readonly { shape: LocalShape }[], settings: ScentSettings): ScentGround {
  const coarse = { ...settings, sampleSpacingM: settings.sampleSpacingM * FAR_SPACING };
  return {
    settings,
    featureCount: features.length,
    near: features.map((f) => sampleFeature(f.shape, settings)),
    far: features.map((f) => sampleFeature(f.shape, coarse)),
    plumes: new Map(),
    reference: referenceStrength(settings),
    scratch: tableScratch(),
  };
}

/** What lies within reach of a source of scent (a seat, or a point of a walk), as distances and bearings. */
export interface SourceGeometry {
  ground: ScentGround;
  heightM: number;
  /** The caller's indices of the features within reach. */
  features: Int32Array;
  /** Samples of features[i] are sampleStart[i] to sampleStart[i + 1]. */
  sampleStart: Int32Array;
  distanceM: Float64Array;
  /** Wind direction that carries scent straight to the sample, degrees. */
  windFromDeg: Float64Array;
  weight: Float64Array;
  /** Made when first asked for; see angular-table.ts. */
  tables: Map<number, AngularTable>;
}

/**
 * For each of 120 wind directions (3 degrees apart from north) the features reached. Four values an entry: position in
 * SourceGeometry.features, share of the feature that bears the exposure, index on that share at 1 m/s, and what the next
 * direction adds to it.
 */
export interface AngularTable {
  start: Int32Array;
  values: Float32Array;
  /** The same memory read as whole numbers: the first of each four is one. */
  places: Int32Array;
  /** Chances for a wind of no direction by level of exposure; made when first asked for, see no-direction.ts. */
  noDirection: Map<number, Float64Array>;
}

/** Lays out what is within the settings' reach of a source. Samples beyond reach are dropped with their weight. */
export function sourceGeometry(ground: ScentGround, at: Point, heightM: number): SourceGeometry {
  const reach = ground.settings.reachM;
  const features: number[] = [];
  const sampleStart: number[] = [0];
  const distances: number[] = [];
  const winds: number[] = [];
  const weights: number[] = [];
  for (let f = 0; f < ground.featureCount; f++) {
    const near = ground.near[f];
    const first = near?.points[0];
    if (!near || !first) continue;
    const sampled =
      Math.hypot(first.eastM - at.eastM, first.northM - at.northM) > FAR_M ? (ground.far[f] ?? near) : near;
    const before = distances.length;
    for (let j = 0; j < sampled.points.length; j++) {
      const p = sampled.points[j];
      if (!p) continue;
      const [east, north] = [p.eastM - at.eastM, p.northM - at.northM];
      const d = Math.hypot(east, north);
      if (!(d <= reach)) continue;
      distances.push(d);
      winds.push(normalizeDeg(Math.atan2(-east, -north) * DEG));
      weights.push(sampled.weights[j] ?? 0);
    }
    if (distances.length === before) continue;
    features.push(f);
    sampleStart.push(distances.length);
  }
  return {
    ground,
    heightM: Number.isFinite(heightM) ? Math.max(0, heightM) : ground.settings.halfSeatHeightM,
    features: Int32Array.from(features),
    sampleStart: Int32Array.from(sampleStart),
    distanceM: Float64Array.from(distances),
    windFromDeg: Float64Array.from(winds),
    weight: Float64Array.from(weights),
    tables: new Map(),
  };
}

/** Plume table of a class, widening level and height, shared by all sources of the ground. */
export function groundPlume(ground: ScentGround, c: StabilityClass, level: number, heightM: number): PlumeTable {
  const key = `${stabilityIndex(c)}/${level}/${heightM}`;
  const kept = ground.plumes.get(key);
  if (kept) return kept;
  const { noseHeightM, reachM } = ground.settings;
  const made = plumeTable(c, WIDENINGS_DEG[level] ?? 0, heightM, noseHeightM, reachM);
  ground.plumes.set(key, made);
  return made;
}
