import type { Forecast, PressureEvent, SitWindow, StandSightings } from './condition-types';
import type { ScoredApproach, ScoredFeature, ScoredStand, Weapon } from './ground-types';
import type { ScoringSettings } from './settings';
import type { Place } from './sun';
import type { Units } from './units';
import type { Gate } from './verdict-types';

/** What lies on the ground and what happened there: the same for every window. */
export interface GroundInput {
  place: Place;
  stands: ScoredStand[];
  features: ScoredFeature[];
  approaches: ScoredApproach[];
  events: PressureEvent[];
  sightings: StandSightings[];
  settings: ScoringSettings;
  /** null: any the stand allows. */
  weapon: Weapon | null;
  /** The club's orange rule in its own words, shown as a caution. */
  orangeRule?: string | null;
  /** Units of the texts; 'us' when not given. */
  units?: Units;
}

/** `list` leaves out timeline, reasons, counterfactuals and the other ways in. */
export type Detail = 'list' | 'full';

/** Many stands in one window. */
export interface RankInput extends GroundInput {
  window: SitWindow;
  forecast: Forecast | null;
  /** Gates by stand id; a stand not named has none. */
  gatesByStand: ReadonlyMap<string, Gate[]>;
  /** UTC ms: age of the forecast is counted from it. */
  now: number;
  /** 'full' when not given. */
  detail?: Detail;
}

/** Many stands in many windows. */
export interface WeekInput extends GroundInput {
  windows: SitWindow[];
  forecast: Forecast | null;
  gatesFor: (standId: string, window: SitWindow) => Gate[];
  now: number;
  /** 'list' when not given. */
  detail?: Detail;
}

/** One stand in one window. */
export interface SitInput extends Omit<RankInput, 'stands' | 'gatesByStand'> {
  stand: ScoredStand;
  gates: Gate[];
}
