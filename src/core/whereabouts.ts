import {
  FEATURE_KINDS,
  type FeatureKind,
  type ScoredFeature,
  TIMES_OF_DAY,
  type TimeOfDay,
  type UseTable,
} from './ground-types';

const MIN = 60_000;

/** Instants of one club-local day, UTC ms; null where the event does not happen. */
export interface SunMarks {
  rise: number | null;
  set: number | null;
  civilDawn: number | null;
  civilDusk: number | null;
  polar: 'none' | 'up_all_day' | 'down_all_day';
}

export interface WhereaboutsSettings {
  /** Chance (0-1) that deer are at a place of a kind at each time of day. */
  use: Record<FeatureKind, UseTable>;
  /** Months 1-12 before and during the rut at the club's place. */
  preRutMonths: number[];
  rutMonths: number[];
  /** Factor on the daylight use of travel lines, crossings, scrapes and rubs in the rut. */
  rutTravelFactor: number;
  /** Factor on the use of scrapes before the rut. */
  preRutScrapeFactor: number;
  /** Deer are not everywhere at once: uses of the places within `crowdM` of one another add up to no more than this. */
  mostInUse: number;
  crowdM: number;
}

function table(...shares: [number, number, number, number, number, number]): UseTable {
  return {
    night: shares[0],
    dawn: shares[1],
    morning: shares[2],
    midday: shares[3],
    afternoon: shares[4],
    dusk: shares[5],
  };
}

/**
 * Practice, held to two studies: food up to five times more by night than by day (Henderson et al. 2023, Wildl. Res.), 85 % of
 * male visits to scrapes after dark (Alexy et al. 2001). Small rut factors: Demarais et al. 1989, Miller & Marchinton 1999.
 */
export const DEFAULT_WHEREABOUTS: WhereaboutsSettings = {
  use: {
    bedding: table(0.15, 0.35, 0.7, 0.75, 0.65, 0.25),
    food_plot: table(0.6, 0.35, 0.12, 0.08, 0.16, 0.5),
    crop: table(0.6, 0.35, 0.1, 0.06, 0.14, 0.5),
    mast: table(0.4, 0.4, 0.3, 0.2, 0.3, 0.4),
    water: table(0.15, 0.15, 0.25, 0.35, 0.25, 0.2),
    scrape: table(0.35, 0.15, 0.06, 0.04, 0.06, 0.15),
    rub_line: table(0.15, 0.2, 0.1, 0.05, 0.1, 0.2),
    travel_line: table(0.2, 0.5, 0.25, 0.1, 0.25, 0.5),
    crossing: table(0.2, 0.45, 0.25, 0.1, 0.25, 0.45),
    sanctuary: table(0.3, 0.4, 0.6, 0.65, 0.6, 0.4),
  },
  preRutMonths: [10],
  rutMonths: [11],
  rutTravelFactor: 1.15,
  preRutScrapeFactor: 1.2,
  mostInUse: 1.5,
  crowdM: 500,
};

/**
 * Weights (sum 1) of the six times of day at an instant, in the order of TIMES_OF_DAY. Plateaus joined by straight lines: deer
 * leave the food and reach the beds over an hour, not at a stroke. Polar days are midday, polar nights are night.
 */
export function timeWeights(at: number, sun: SunMarks): number[] {
  const out = [0, 0, 0, 0, 0, 0];
  if (sun.rise === null || sun.set === null) {
    out[sun.polar === 'up_all_day' ? 3 : 0] = 1;
    return out;
  }
  const dawn = sun.civilDawn ?? sun.rise - 30 * MIN;
  const dusk = sun.civilDusk ?? sun.set + 30 * MIN;
  const noon = (sun.rise + sun.set) / 2;
  const marks: [number, number][] = [
    [dawn - 45 * MIN, 0],
    [dawn - 10 * MIN, 1],
    [sun.rise + 10 * MIN, 1],
    [sun.rise + 75 * MIN, 2],
    [noon - 150 * MIN, 2],
    [noon - 75 * MIN, 3],
    [noon + 75 * MIN, 3],
    [noon + 150 * MIN, 4],
    [sun.set - 75 * MIN, 4],
    [sun.set - 10 * MIN, 5],
    [dusk + 10 * MIN, 5],
    [dusk + 45 * MIN, 0],
  ];
  let [fromAt, fromTime] = marks[0] as [number, number];
  if (at <= fromAt) {
    out[0] = 1;
    return out;
  }
  for (let i = 1; i < marks.length; i++) {
    const [markAt, time] = marks[i] as [number, number];
    const toAt = Math.max(markAt, fromAt);
    if (at < toAt) {
      const share = (at - fromAt) / (toAt - fromAt);
      out[fromTime] = (out[fromTime] as number) + 1 - share;
      out[time] = (out[time] as number) + share;
      return out;
    }
    fromAt = toAt;
    fromTime = time;
  }
  out[0] = 1;
  return out;
}

/** The time of day that weighs most at an instant. */
export function timeOfDay(at: number, sun: SunMarks): TimeOfDay {
  const weights = timeWeights(at, sun);
  return TIMES_OF_DAY[weights.indexOf(Math.max(...weights))] as TimeOfDay;
}

const RUT_KINDS: ReadonlySet<FeatureKind> = new Set(['travel_line', 'crossing', 'scrape', 'rub_line']);

/**
 * Six shares (0-1) for a feature in a month, in the order of TIMES_OF_DAY; all 0 in a month in which deer do not use it. A
 * steward's own table stands as he wrote it: no season is laid over the times he names.
 */
export function usesOf(feature: ScoredFeature, month: number, settings: WhereaboutsSettings): number[] {
  if (!feature.months.includes(month)) return TIMES_OF_DAY.map(() => 0);
  const base = settings.use[feature.kind];
  const rut = settings.rutMonths.includes(month) && RUT_KINDS.has(feature.kind) ? settings.rutTravelFactor : 1;
  const preRut = settings.preRutMonths.includes(month) && feature.kind === 'scrape' ? settings.preRutScrapeFactor : 1;
  return TIMES_OF_DAY.map((time) => {
    const own = feature.use?.[time];
    const daylight = time === 'morning' || time === 'midday' || time === 'afternoon';
    const share = own ?? base[time] * (daylight ? rut : 1) * preRut;
    return Math.min(1, Math.max(0, Number.isFinite(share) ? share : 0));
  });
}

/**
 * Uses thinned where places crowd: at each time of day a place keeps `mostInUse` over what the places near it add up to, when that
 * is less than one. Mapping a ground more finely then does not fill it with deer. `near` lists each place's neighbours, itself too.
 */
export function thinCrowded(uses: number[][], near: Int32Array[], s: WhereaboutsSettings): number[][] {
  return uses.map((own, f) =>
    own.map((use, time) => {
      if (use === 0) return 0;
      let sum = 0;
      for (const g of near[f] ?? []) sum += uses[g]?.[time] ?? 0;
      return use * Math.min(1, s.mostInUse / sum);
    }),
  );
}

/** Chance (0-1) that deer are at a place with these six shares under these six weights. */
export function shareAt(uses: number[], weights: number[]): number {
  let sum = 0;
  for (let i = 0; i < 6; i++) sum += (uses[i] as number) * (weights[i] as number);
  return sum;
}

/** Every kind with its table: what a settings page shows. */
export function listUses(settings: WhereaboutsSettings): { kind: FeatureKind; use: UseTable }[] {
  return FEATURE_KINDS.map((kind) => ({ kind, use: settings.use[kind] }));
}
