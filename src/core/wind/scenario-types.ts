export interface ScenarioStep {
  /** Where the half hour's mean wind comes from; null: any direction alike. */
  fromDeg: number | null;
  speedMps: number;
}

/** One plausible course of the wind through the sit. */
export interface WindScenario {
  /** Weights of a set sum to 1. */
  weight: number;
  /** One for each step of the set. */
  steps: ScenarioStep[];
}

/**
 * The wind of a sit as scenarios that differ by a lasting error. Two narrower spreads lie around each step of a scenario:
 * the bundle of neighbouring lasting errors it stands for, and fast scatter that averages out within the step.
 */
export interface ScenarioSet {
  /** Starts of the steps. */
  at: number[];
  /** false: no forecast reaches this step, and the scenarios say nothing there. */
  known: boolean[];
  scenarios: WindScenario[];
  /** Standard deviation of fast scatter at each step, degrees. */
  scatterDeg: number[];
  /** Standard deviation of the lasting errors one scenario stands for at each step, degrees. */
  bundleDeg: number[];
  /** From the forecast's issue to the first step, hours, 0 and up. */
  leadHours: number;
  source: 'members' | 'error_model' | 'none';
  /** Whose wind it is: 10 m over open ground, or at a stand's seat with drift and shelter. */
  level: 'open' | 'seat';
}
