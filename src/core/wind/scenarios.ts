import { usableWinds, windAt } from '../air/interpolate';
import type { PlaceStep } from '../air/place-air';
import { normalizeDeg } from '../angles';
import type { Forecast } from '../condition-types';
import type { ScoringSettings } from '../settings';
import { directionErrorDeg, normalNodes, widenByVariable } from './error-model';
import { scatterDeg } from './scatter';
import type { ScenarioSet, ScenarioStep, WindScenario } from './scenario-types';

const HOUR = 3_600_000;
/** Nodes half a spacing wide blend into a smooth curve (aliasing 2 exp(-2 pi^2 / 4) = 1.4 %). */
const BUNDLE_OF_SPACING = 0.5;
/** Directions of the stray scenarios, relative to the forecast. */
const STRAY_TURNS = [45, 90, 135, 180, 225, 270, 315];

/**
 * Scenarios of the open 10 m wind over steps from placeAir. Ensemble members as they are, of equal weight, when there are
 * enough; else the forecast turned by an error that lasts the whole sit, at fixed points of a normal distribution whose
 * spread follows speed and lead. Calm and variable steps have no direction. No forecast: source 'none', no scenarios.
 */
export function buildScenarios(steps: PlaceStep[], forecast: Forecast | null, settings: ScoringSettings): ScenarioSet {
  const known = steps.map((s) => s.kind !== 'missing');
  const at = steps.map((s) => s.at);
  const issued = forecast && Number.isFinite(forecast.issuedAt) ? forecast.issuedAt : (at[0] ?? 0);
  const leads = at.map((t) => Math.max(0, (t - issued) / HOUR));
  const scatter = steps.map((s) => scatterDeg(s.stability, s.speedMps ?? 0, settings.wind.scatterCapDeg));
  const base = { at, known, scatterDeg: scatter, leadHours: leads[0] ?? 0, level: 'open' as const };
  if (!forecast || !known.includes(true)) {
    return { ...base, scenarios: [], bundleDeg: at.map(() => 0), source: 'none' };
  }
  const members = fromMembers(steps, forecast, settings);
  if (members) return { ...base, ...members, source: 'members' };
  return { ...base, ...fromErrorModel(steps, leads, scatter, settings), source: 'error_model' };
}

type Built = Pick<ScenarioSet, 'scenarios' | 'bundleDeg'>;

function fromErrorModel(steps: PlaceStep[], leads: number[], scatter: number[], settings: ScoringSettings): Built {
  const s = settings.wind;
  const nodes = normalNodes(s.scenarioCount);
  const widen = BUNDLE_OF_SPACING * nodes.spacing;
  // Error against an observation holds scatter too: what is left of its variance is the lasting part.
  const lasting = steps.map((step, t) => {
    const error = directionErrorDeg(step.speedMps ?? 0, leads[t] ?? 0, s);
    const total = widenByVariable(error, step.variableShare);
    return Math.sqrt(Math.max(0, total ** 2 - (scatter[t] ?? 0) ** 2) / (1 + widen ** 2));
  });
  const turned = (turn: (t: number) => number): ScenarioStep[] =>
    steps.map((step, t) => ({
      fromDeg: step.fromDeg === null ? null : normalizeDeg(step.fromDeg + turn(t)),
      speedMps: step.speedMps ?? 0,
    }));
  const stray = Math.max(0, Math.min(1, s.strayShare));
  const scenarios: WindScenario[] = nodes.z.map((z, i) => ({
    weight: (nodes.weights[i] ?? 0) * (1 - stray),
    steps: turned((t) => z * (lasting[t] ?? 0)),
  }));
  if (stray > 0) {
    for (const turn of STRAY_TURNS) scenarios.push({ weight: stray / STRAY_TURNS.length, steps: turned(() => turn) });
  }
  return { scenarios, bundleDeg: lasting.map((deg) => deg * widen) };
}

function fromMembers(steps: PlaceStep[], forecast: Forecast, settings: ScoringSettings): Built | null {
  const courses: ScenarioStep[][] = [];
  for (const member of forecast.members) {
    const winds = usableWinds(member.hours);
    const course = steps.map((step) => windAt(winds, step.at + settings.air.stepMinutes * 30_000, settings.air));
    if (course.some((w, t) => w.kind === 'missing' && steps[t]?.kind !== 'missing')) continue;
    courses.push(course.map((w) => ({ fromDeg: w.fromDeg, speedMps: w.speedMps ?? 0 })));
  }
  if (courses.length < Math.max(1, settings.wind.leastMembers)) return null;
  const scenarios = courses.map((course) => ({ weight: 1 / courses.length, steps: course }));
  return { scenarios, bundleDeg: steps.map((_, t) => memberGapDeg(scenarios, t)) };
}

/** Width each member stands for: three standard deviations shared among them, at most 15 degrees. */
function memberGapDeg(scenarios: WindScenario[], t: number): number {
  let cos = 0;
  let sin = 0;
  let n = 0;
  for (const { steps } of scenarios) {
    const deg = steps[t]?.fromDeg ?? null;
    if (deg === null) continue;
    cos += Math.cos((deg * Math.PI) / 180);
    sin += Math.sin((deg * Math.PI) / 180);
    n++;
  }
  const r = n > 0 ? Math.min(1, Math.hypot(cos, sin) / n) : 1;
  const sd = r > 0.01 ? (Math.sqrt(-2 * Math.log(r)) * 180) / Math.PI : 170;
  return Math.min(15, (3 * sd) / scenarios.length);
}
