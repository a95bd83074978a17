import { type AirStep, addDrift } from '../air/stand-air';
import { normalizeDeg } from '../angles';
import type { ScenarioSet, ScenarioStep } from './scenario-types';

/**
 * A set of open wind as it is at one stand's seat: slowed by height and shelter, slope drift added to every scenario. Where
 * drift meets a wind of no direction, the scenarios are spread round the circle by their weight and drift is added to each.
 */
export function scenariosAtStand(open: ScenarioSet, air: AirStep[]): ScenarioSet {
  let below = 0;
  const scenarios = open.scenarios.map(({ weight, steps }) => {
    const middle = below + weight / 2;
    below += weight;
    return { weight, steps: steps.map((step, t) => atSeat(step, air[t], middle)) };
  });
  return { ...open, scenarios, level: 'seat' };
}

function atSeat(step: ScenarioStep, air: AirStep | undefined, quantile: number): ScenarioStep {
  if (!air) return step;
  const speedMps = step.speedMps * air.seatShare;
  if (!(air.driftWeight > 0) || air.driftFromDeg === null) return { fromDeg: step.fromDeg, speedMps };
  const from = step.fromDeg ?? normalizeDeg(air.driftFromDeg + quantile * 360);
  return addDrift(from, speedMps, air);
}
