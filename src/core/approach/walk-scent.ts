import { STABILITY_CLASSES } from '../air/stability-types';
import { normalizeDeg } from '../angles';
import { atDistance, type PlumeTable, plumeTable } from '../scent/plume-table';
import { exposurePerIndex, referenceStrength } from '../scent/saturate';
import type { ScentSettings } from '../settings';
import type { ApproachSettings } from './approach-settings';
import { WALK_BINS } from './walk-chance';
import type { Sight, WalkGround } from './walk-ground';

const BIN_DEG = 360 / WALK_BINS;

/** Plumes of a walker by stability class, made once for a club's settings. */
export interface WalkPlumes {
  tables: (PlumeTable | null)[];
  /** From plume strength to the exposure of one passing. */
  scale: number;
  scent: ScentSettings;
  approach: ApproachSettings;
}

export function walkPlumes(scent: ScentSettings, approach: ApproachSettings): WalkPlumes {
  const scale = exposurePerIndex(approach.passingMinutes, scent) / referenceStrength(scent);
  return { tables: STABILITY_CLASSES.map(() => null), scale, scent, approach };
}

function plumeOf(plumes: WalkPlumes, stability: number): PlumeTable {
  const known = plumes.tables[stability];
  if (known) return known;
  const { approach, scent } = plumes;
  const made = plumeTable(
    STABILITY_CLASSES[stability] ?? 'D',
    approach.sweepDeg,
    approach.sourceHeightM,
    scent.noseHeightM,
    approach.scentReachM,
  );
  plumes.tables[stability] = made;
  return made;
}

/** Raises a row's bins to the exposure one point of the walk lays on a feature; the span it fills gets the axis value. */
function layOn(row: Float32Array, sight: Sight, plume: PlumeTable, scale: number, approach: ApproachSettings): void {
  if (sight.metres > approach.scentReachM) return;
  const strength = scale * (sight.driven ? approach.vehicleScentFactor : 1) * atDistance(plume.onAxis, sight.metres);
  const sigma = atDistance(plume.sigmaDeg, sight.metres);
  const reachDeg = Math.min(90, 4 * sigma);
  // The wind that carries scent along a bearing comes from the other side.
  const from = normalizeDeg(sight.fromDeg + 180);
  const first = Math.ceil((from - reachDeg) / BIN_DEG);
  const last = Math.floor((from + sight.widthDeg + reachDeg) / BIN_DEG);
  for (let b = first; b <= last; b++) {
    const past = b * BIN_DEG - from;
    const off = past < 0 ? -past : Math.max(0, past - sight.widthDeg);
    const value = off === 0 ? strength : strength * Math.exp((-off * off) / (2 * sigma * sigma));
    const bin = ((b % WALK_BINS) + WALK_BINS) % WALK_BINS;
    if (value > (row[bin] as number)) row[bin] = value;
  }
}

/**
 * A walk's table for a stability class (0 A to 5 F): for each of its features and 120 wind directions, the exposure at the worst
 * point of the way in a wind of 1 m/s. Made when first asked for and kept with the walk.
 */
export function walkTable(ground: WalkGround, stability: number, plumes: WalkPlumes): Float32Array {
  const known = ground.tables[stability];
  if (known) return known;
  const plume = plumeOf(plumes, stability);
  const table = new Float32Array(ground.slots.length * WALK_BINS);
  ground.slots.forEach((slot, i) => {
    const row = table.subarray(i * WALK_BINS, (i + 1) * WALK_BINS);
    for (const sight of slot.sights) layOn(row, sight, plume, plumes.scale, plumes.approach);
  });
  ground.tables[stability] = table;
  return table;
}
