import { type ApproachSettings, DEFAULT_APPROACH } from './approach/approach-settings';
import type { ShelterClass } from './ground-types';
import { DEFAULT_PRESSURE, type PressureSettings } from './pressure';
import { DEFAULT_PROMISE, type PromiseSettings } from './promise/promise-settings';
import { DEFAULT_SCORE, type ScoreSettings } from './score';
import { HUNT_SETTING_NOTES } from './setting-notes';
import type { Evidence } from './verdict-types';
import { DEFAULT_WHEREABOUTS, type WhereaboutsSettings } from './whereabouts';

/** A value at a speed; values between entries are interpolated, ends are held. */
export interface SpeedPoint {
  speedMps: number;
  deg: number;
}

export interface AirSettings {
  /** Length of a step in minutes. */
  stepMinutes: number;
  /** Longest gap between two hours of a forecast that is bridged, hours. */
  maxGapHours: number;
  /** Below this 10 m speed the air counts as calm, m/s. */
  calmMps: number;
  /** Two hours whose winds cancel to less than this share of their mean speed leave the direction variable. */
  cancelShare: number;
  /** Cloud assumed when the forecast gives none, 0-100. */
  cloudWhenUnknownPercent: number;
  /** Wind at the seat as a share of open wind at the same height. */
  shelterShare: Record<ShelterClass, number>;
  drift: DriftSettings;
}

export interface DriftSettings {
  /** false for a club that hunts flat land. */
  modelled: boolean;
  /** Slope assumed where a stand has a drain bearing but no slope, percent. */
  slopeWhenUnknownPercent: number;
  /** Slopes below this are flat, percent. */
  leastSlopePercent: number;
  /** General 10 m wind at which drift is whole, and at which it is gone, m/s. */
  wholeBelowMps: number;
  goneAboveMps: number;
  /** Cloud at which drift is whole, and at which it is gone, percent. */
  wholeBelowCloudPercent: number;
  goneAboveCloudPercent: number;
  /** Sun on the slope (cosine of incidence) at which drain flow weakens, and at which upslope flow is whole. */
  drainUntilSun: number;
  upslopeFromSun: number;
}

export interface WindSettings {
  /** Spread (standard deviation) of direction error against an observation in the first day of lead. */
  errorBySpeed: SpeedPoint[];
  /** Added for each day of lead after the first, degrees. */
  errorPerLeadDayDeg: number;
  /** Lead never spreads a wind past this, degrees. */
  errorCapDeg: number;
  /** Share of forecasts that are wrong altogether: any direction as likely as another, for the whole sit. */
  strayShare: number;
  /** Scenarios the lasting error is cut into. Odd. */
  scenarioCount: number;
  /** Ensemble members needed before they replace the error model. */
  leastMembers: number;
  /** Scatter is never more than this, degrees. */
  scatterCapDeg: number;
}

export interface ScentSettings {
  /** Height of a deer's nose, m. */
  noseHeightM: number;
  /** Plume speeds below this are raised to it, m/s. */
  leastSpeedMps: number;
  /** Distance straight downwind (neutral air, 2 m/s at the seat) at which the index is one. */
  halfAtM: number;
  /** Seat height the reference is taken at, m. */
  halfSeatHeightM: number;
  /** Minutes a deer must stay at an index of one for an even chance of winding. */
  exposureMinutes: number;
  /** Features farther away than this are left out, m. */
  reachM: number;
  /** Most sample points of one feature. */
  mostSamples: number;
  /** Spacing samples aim for, m. */
  sampleSpacingM: number;
}

export interface ScoringSettings {
  air: AirSettings;
  wind: WindSettings;
  scent: ScentSettings;
  whereabouts: WhereaboutsSettings;
  approach: ApproachSettings;
  pressure: PressureSettings;
  promise: PromiseSettings;
  score: ScoreSettings;
}

export const DEFAULT_SETTINGS: ScoringSettings = {
  air: {
    stepMinutes: 30,
    maxGapHours: 2,
    calmMps: 0.5,
    cancelShare: 0.2,
    cloudWhenUnknownPercent: 50,
    shelterShare: { open: 1, edge: 0.75, open_wood: 0.5, dense_wood: 0.25 },
    drift: {
      modelled: true,
      slopeWhenUnknownPercent: 15,
      leastSlopePercent: 3,
      wholeBelowMps: 2.2352,
      goneAboveMps: 4.4704,
      wholeBelowCloudPercent: 30,
      goneAboveCloudPercent: 80,
      drainUntilSun: 0.1,
      upslopeFromSun: 0.3,
    },
  },
  wind: {
    errorBySpeed: [
      { speedMps: 0, deg: 180 },
      { speedMps: 1, deg: 130 },
      { speedMps: 2, deg: 85 },
      { speedMps: 2.5, deg: 60 },
      { speedMps: 4, deg: 40 },
      { speedMps: 6, deg: 30 },
      { speedMps: 8, deg: 25 },
    ],
    errorPerLeadDayDeg: 5,
    errorCapDeg: 90,
    strayShare: 0,
    scenarioCount: 11,
    leastMembers: 5,
    scatterCapDeg: 40,
  },
  scent: {
    noseHeightM: 1,
    leastSpeedMps: 1,
    halfAtM: 274.32,
    halfSeatHeightM: 5,
    exposureMinutes: 120,
    reachM: 800,
    mostSamples: 12,
    sampleSpacingM: 40,
  },
  whereabouts: DEFAULT_WHEREABOUTS,
  approach: DEFAULT_APPROACH,
  pressure: DEFAULT_PRESSURE,
  promise: DEFAULT_PROMISE,
  score: DEFAULT_SCORE,
};

export interface SettingNote {
  evidence: Evidence;
  note: string;
}

/** What each setting rests on, by path; a path that ends in `*` speaks for everything under it. */
export const SETTING_NOTES: Record<string, SettingNote> = {
  'whereabouts.crowdM': { evidence: 'our choice', note: 'Places this near one another share the same deer.' },
  'air.stepMinutes': { evidence: 'our choice', note: 'Half hours: finer than the forecast, coarse enough to read.' },
  'air.maxGapHours': { evidence: 'our choice', note: 'Longer gaps are shown as no forecast.' },
  'air.calmMps': {
    evidence: 'standard',
    note: 'Below the start speed of common vane-and-cup gauges (EPA-454/R-99-005).',
  },
  'air.cancelShare': { evidence: 'our choice', note: 'Two hours of opposed wind leave no direction between them.' },
  'air.cloudWhenUnknownPercent': { evidence: 'our choice', note: 'Half cover when the forecast gives no cloud.' },
  'air.shelterShare.*': {
    evidence: 'standard',
    note: 'NWCG wind adjustment factors 0.4 unsheltered, 0.3 partly, 0.2 and 0.1 sheltered, as shares of the first.',
  },
  'air.drift.*': {
    evidence: 'practice',
    note: 'NWCG PMS 437: slope flow wants a clear sky and a light general wind; the bounds are ours.',
  },
  'wind.errorBySpeed': {
    evidence: 'our choice',
    note: 'Consistent with Lavdas (38 % within 22.5 degrees) and MAE near 30 degrees of good models; under 2 m/s all but uniform.',
  },
  'wind.errorPerLeadDayDeg': {
    evidence: 'our choice',
    note: 'No published table of direction error by lead was found.',
  },
  'wind.errorCapDeg': { evidence: 'our choice', note: 'Past this the forecast says next to nothing.' },
  'wind.strayShare': {
    evidence: 'study',
    note: 'Forecast errors have fat tails (Lavdas: 79 % within 67.5 degrees). Zero unless tuned.',
  },
  'wind.scenarioCount': {
    evidence: 'our choice',
    note: 'Enough for arc shares within 0.01 of the smooth curve; each stands for a bundle of directions.',
  },
  'wind.leastMembers': { evidence: 'our choice', note: 'Fewer members than this say too little about spread.' },
  'wind.scatterCapDeg': { evidence: 'our choice', note: 'The 1/V law runs away near zero.' },
  'scent.noseHeightM': { evidence: 'our choice', note: 'Head height of a walking deer.' },
  'scent.leastSpeedMps': {
    evidence: 'standard',
    note: 'EPA: raise speeds below 1 m/s to 1 m/s in steady plume models.',
  },
  'scent.halfAtM': {
    evidence: 'our choice',
    note: 'Practice says disturbance carries 200-400 yards; 300 yards is the middle. No study gives a distance: an index, not a promise.',
  },
  'scent.halfSeatHeightM': { evidence: 'our choice', note: 'A common hang-on height.' },
  'scent.exposureMinutes': {
    evidence: 'our choice',
    note: 'Even odds for a deer that stays two hours at the reference distance.',
  },
  'scent.reachM': { evidence: 'our choice', note: 'Beyond half a mile the index is too small to matter.' },
  'scent.mostSamples': { evidence: 'our choice', note: 'Bounds the work for one feature.' },
  'scent.sampleSpacingM': { evidence: 'our choice', note: 'About the width of a plume at 200 m.' },
  ...HUNT_SETTING_NOTES,
};
