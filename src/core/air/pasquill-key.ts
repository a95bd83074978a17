import type { StabilityClass } from './stability-types';

export type PasquillSky =
  | 'overcast'
  | 'day_strong'
  | 'day_moderate'
  | 'day_slight'
  | 'night_cloudy'
  | 'night_clear'
  /** The hour just before or just after the night period. */
  | 'turn_of_day';

type Range = [StabilityClass, StabilityClass];
const one = (c: StabilityClass): Range => [c, c];
const A_B: Range = ['A', 'B'];
const B_C: Range = ['B', 'C'];
const C_D: Range = ['C', 'D'];

type Column = Exclude<PasquillSky, 'overcast' | 'turn_of_day'>;

/** Pasquill 1961, Meteorol. Mag. 90:33-49, as printed by NOAA Air Resources Laboratory. Rows by upper 10 m speed, m/s. */
const ROWS: { belowMps: number; classes: Record<Column, Range> }[] = [
  {
    belowMps: 2,
    classes: {
      day_strong: one('A'),
      day_moderate: A_B,
      day_slight: one('B'),
      night_cloudy: one('E'),
      night_clear: one('F'),
    },
  },
  {
    belowMps: 3,
    classes: {
      day_strong: A_B,
      day_moderate: one('B'),
      day_slight: one('C'),
      night_cloudy: one('E'),
      night_clear: one('F'),
    },
  },
  {
    belowMps: 5,
    classes: {
      day_strong: one('B'),
      day_moderate: B_C,
      day_slight: one('C'),
      night_cloudy: one('D'),
      night_clear: one('E'),
    },
  },
  {
    belowMps: 6,
    classes: {
      day_strong: one('C'),
      day_moderate: C_D,
      day_slight: one('D'),
      night_cloudy: one('D'),
      night_clear: one('D'),
    },
  },
  {
    belowMps: Number.POSITIVE_INFINITY,
    classes: {
      day_strong: one('C'),
      day_moderate: one('D'),
      day_slight: one('D'),
      night_cloudy: one('D'),
      night_clear: one('D'),
    },
  },
];

/**
 * Pasquill's key: 10 m wind (m/s, 0 and up) and sky to the least and most stable class of the cell (the same letter twice
 * for most cells). Overcast, and the hour either side of the night period, are D whatever the speed.
 */
export function pasquillKey(speedMps: number, sky: PasquillSky): Range {
  if (sky === 'overcast' || sky === 'turn_of_day') return one('D');
  const row = ROWS.find((r) => speedMps < r.belowMps) ?? ROWS[ROWS.length - 1];
  return row ? row.classes[sky] : one('D');
}

/** Column of the key at night by cloud in eighths: up to half the sky is clear. */
export function nightSky(cloudEighths: number): PasquillSky {
  if (cloudEighths >= 8) return 'overcast';
  return cloudEighths > 4 ? 'night_cloudy' : 'night_clear';
}
