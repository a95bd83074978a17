import type { Forecast, SitWindow, WeatherHour, WindowName } from '../condition-types';
import type { ScoredStand } from '../ground-types';
import { prepareGround, rankSits } from '../rank';
import type { GroundInput } from '../rank-input';
import type { Verdict } from '../verdict-types';
import type { Finding, SetupEffect, SetupTrial, UsualWinds } from './setup-types';
import { windowsHunted, windsHunted } from './shot-of';
import { PART_WORDS } from './words/parts';

const HOUR = 3_600_000;
/** A middling hunting wind: 8 mph. */
const USUAL_MPS = 3.5;

/** A steady wind about a window, forecast the day before. */
function steadyWind(window: SitWindow, fromDeg: number): Forecast {
  const first = Math.floor(window.startAt / HOUR) * HOUR - 4 * HOUR;
  const count = Math.ceil((window.endAt - first) / HOUR) + 4;
  const hours = Array.from(
    { length: count },
    (_, i): WeatherHour => ({
      at: first + i * HOUR,
      windFromDeg: fromDeg,
      windSpeedMps: USUAL_MPS,
      gustMps: null,
      tempC: null,
      pressureHpa: null,
      precipMm: 0,
      cloudPercent: 20,
      radiationWm2: null,
      thunder: false,
    }),
  );
  return { issuedAt: first, fetchedAt: first, source: PART_WORDS.usualWind, hours, members: [] };
}

/** The window a stand is rated best for, and the commonest of the winds it is hunted on then. */
export function usualSit(stand: ScoredStand, winds: UsualWinds | null, asked: WindowName | null) {
  const hunted = windowsHunted(stand);
  const window = asked ?? hunted.find((w) => stand.suitability[w] === 'prime') ?? hunted[0] ?? 'morning';
  const points = windsHunted(stand, window);
  const middle = points[Math.floor(points.length / 2)] ?? 0;
  const commonest = winds
    ? points.reduce((a, b) => ((winds[window][b] ?? 0) > (winds[window][a] ?? 0) ? b : a), points[0] ?? 0)
    : middle;
  return { window, windFromDeg: commonest * 22.5 };
}

function changed(ground: GroundInput, trial: SetupTrial): GroundInput | null {
  const stands = ground.stands.filter((s) => s.id === trial.standId);
  if (trial.change === 'facing') {
    return { ...ground, stands: stands.map((s) => ({ ...s, facingDeg: trial.facingDeg })) };
  }
  if (trial.change === 'without_features') {
    const gone = new Set(trial.featureIds);
    return { ...ground, stands, features: ground.features.filter((f) => !gone.has(f.id)) };
  }
  const others = ground.approaches.filter((a) => a.standId === trial.standId && a.id !== trial.approachId);
  return others.length > 0 ? { ...ground, stands, approaches: others } : null;
}

function judge(ground: GroundInput, window: SitWindow, windFromDeg: number): Verdict | null {
  const forecast = steadyWind(window, windFromDeg);
  const gatesByStand = new Map();
  const now = window.startAt - 12 * HOUR;
  return rankSits({ ...ground, window, forecast, gatesByStand, now, detail: 'list' }, prepareGround(ground))[0] ?? null;
}

/**
 * What mending a finding gains on the commonest wind its stand is hunted on, by the scoring core: quiet (0-100), or promise where
 * the seat is turned. A fault of a way is held against the stand's other ways. null: nothing to compare with. Events and
 * sightings of `ground` count on both sides alike. A weigher remembers each stand as it is, for the next of its findings.
 */
export function makeWeigher(ground: GroundInput, windows: SitWindow[], winds: UsualWinds | null) {
  const known = new Map<string, Verdict | null>();
  return ({ trial }: Pick<Finding, 'trial'>): SetupEffect | null => {
    const stand = ground.stands.find((s) => s.id === trial?.standId);
    if (!trial || !stand) return null;
    const mended = changed(ground, trial);
    const sit = usualSit(stand, winds, trial.window);
    const window = middleOf(windows, sit.window);
    if (!mended || !window) return null;
    const byWay = trial.change === 'without_approach' ? trial.approachId : null;
    const key = JSON.stringify([stand.id, sit, byWay]);
    let before = known.get(key);
    if (before === undefined) {
      const approaches = byWay === null ? ground.approaches : ground.approaches.filter((a) => a.id === byWay);
      before = judge({ ...ground, stands: [stand], approaches }, window, sit.windFromDeg);
      known.set(key, before);
    }
    const after = judge(mended, window, sit.windFromDeg);
    if (!before || !after) return null;
    const measure = trial.change === 'facing' ? 'promise' : 'quiet';
    return { ...sit, measure, before: before[measure], after: after[measure] };
  };
}

function middleOf(windows: SitWindow[], name: WindowName): SitWindow | undefined {
  const named = windows.filter((w) => w.window === name);
  return named[Math.floor(named.length / 2)];
}

/** A stand on the commonest wind it is hunted on, by the scoring core; null: no window to judge it in. */
export function judgeUsual(
  stand: ScoredStand,
  ground: GroundInput,
  windows: SitWindow[],
  winds: UsualWinds | null,
): { window: WindowName; windFromDeg: number; quiet: number; promise: number } | null {
  const sit = usualSit(stand, winds, null);
  const window = middleOf(windows, sit.window);
  const verdict = window && judge({ ...ground, stands: [stand] }, window, sit.windFromDeg);
  return verdict ? { ...sit, quiet: verdict.quiet, promise: verdict.promise } : null;
}
