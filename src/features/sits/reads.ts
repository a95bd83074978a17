import { legalLightRuleOf } from '@/core/booking/seasons';
import type { SitWindow, WindowName } from '@/core/condition-types';
import { dayOf } from '@/core/day-time';
import { WEAPONS, type Weapon } from '@/core/ground-types';
import { legalLight } from '@/core/legal-light';
import { moonAt } from '@/core/moon';
import { rankSits } from '@/core/rank';
import type { Detail } from '@/core/rank-input';
import { sunTimes } from '@/core/sun';
import type { Verdict } from '@/core/verdict-types';
import { nextWindow, sitWindow } from '@/core/windows';
import { readQuotaCautions } from '@/features/harvest/quota-cautions';
import { maySeeSightings } from '@/features/logs/see-sightings';
import { declinationDeg } from '@/features/map/magnetic';
import type { KeptForecast } from '@/features/weather/get-forecast';
import { notFound } from '@/server/errors';
import type { ClubScope, ScopeClub } from '@/server/scope';
import { shapeDetail } from './detail-view';
import { forecastView, loadForecast } from './load-forecast';
import { loadOpenStands, readerOf } from './load-open';
import { loadScoring, type Scoring } from './load-scoring';
import { shapeRows, sharedCautions } from './view';
import type { ClubView, LightView, OwnSit, SitDetailView, SitsView, SkyView } from './view-types';
import { weatherLines } from './weather-lines';
import { MOON_WORDS } from './words/reads';
import { legalLightText } from './words/terms';

export interface SitsAsk {
  /** Left out: the next window, or the one going on. */
  day?: string | undefined;
  window?: WindowName | undefined;
  weapon?: Weapon | undefined;
}

export interface ReadOptions {
  /** In place of the kept forecast: replays. */
  forecast?: KeptForecast;
  /** leave_out: as if every stand were free. A past day knows nothing of today's bookings. */
  rules?: 'apply' | 'leave_out';
}

export function clubView({ slug, name, zone, units }: ScopeClub): ClubView {
  return { slug, name, zone, units };
}

/** Nobody walks in for a window's last two hours. */
const TOO_LATE_MS = 2 * 3_600_000;

/** The window to choose a stand for now: the one going on while it is worth walking in, else the next. */
export function windowToPick(now: number, club: ScopeClub): SitWindow {
  return nextWindow(now + TOO_LATE_MS, club.rules, club);
}

/** The window asked for; half an answer is filled in from the next window. */
export function askedWindow(scope: ClubScope, ask: SitsAsk, now: number): SitWindow {
  const { club } = scope;
  const next = windowToPick(now, club);
  if (!ask.day && !ask.window) return next;
  const day = ask.day ?? next.day;
  return sitWindow(day, ask.window ?? (day === next.day ? next.window : 'morning'), club.rules, club);
}

function skyOf(club: ScopeClub, window: SitWindow): SkyView {
  const moon = moonAt(window.startAt);
  const sun = sunTimes(window.day, club.zone, club.lat, club.lon);
  return { ...sun, moon: MOON_WORDS.lit(moon.name, Math.round(moon.litShare * 100)) };
}

function lightOf(club: ScopeClub, day: string, weapon: Weapon | null): LightView | null {
  const rule = legalLightRuleOf(club.rules, day, weapon);
  const span = rule ? legalLight(rule, day, club) : null;
  return rule && span ? { ...span, text: legalLightText(rule) } : null;
}

interface Ranked {
  window: SitWindow;
  weapon: Weapon | null;
  kept: KeptForecast;
  scoring: Scoring;
  mine: OwnSit | null;
  verdicts: Verdict[];
}

async function rank(
  scope: ClubScope,
  ask: SitsAsk & { standId?: string; detail: Detail },
  now: number,
  options: ReadOptions,
): Promise<Ranked> {
  const window = askedWindow(scope, ask, now);
  const weapon = ask.weapon ?? null;
  const scoring = await loadScoring(scope, { day: window.day, until: window.startAt, weapon }, now);
  const kept = options.forecast ?? (await loadForecast(scope, now));
  const open =
    options.rules === 'leave_out'
      ? { gatesByStand: new Map(), mine: null }
      : await loadOpenStands(scope, { window, memberId: readerOf(scope), weapon, now });
  const { input } = scoring;
  const stands = ask.standId ? input.stands.filter((stand) => stand.id === ask.standId) : input.stands;
  const { gatesByStand, mine } = open;
  const verdicts = rankSits({
    ...input,
    stands,
    window,
    forecast: kept.forecast,
    gatesByStand,
    now,
    detail: ask.detail,
  });
  return { window, weapon, kept, scoring, mine, verdicts };
}

/** The ranked list of a window: open stands by sit score, then those a rule stops. */
export async function readSits(
  scope: ClubScope,
  ask: SitsAsk,
  now: number,
  options: ReadOptions = {},
): Promise<SitsView> {
  const { club } = scope;
  const { window, weapon, kept, scoring, mine, verdicts } = await rank(scope, { ...ask, detail: 'list' }, now, options);
  const { input, rows } = scoring;
  const shared = sharedCautions(verdicts);
  const quotas = options.rules === 'leave_out' ? [] : await readQuotaCautions(scope, { day: window.day });
  const stands = new Map(input.stands.map((stand) => [stand.id, stand]));
  return {
    club: clubView(club),
    window,
    over: window.endAt <= now,
    weapon,
    weapons: WEAPONS.filter((w) => input.stands.some((stand) => stand.shotRangeM[w] !== undefined)),
    sky: skyOf(club, window),
    light: lightOf(club, window.day, weapon),
    forecast: forecastView(kept, window),
    weather: weatherLines(kept.forecast, window, club.units),
    cautions: [...quotas, ...shared],
    ...shapeRows(verdicts, mine?.standId ?? null, { club, window, now, stands, rows, shared }),
    mine,
    standCount: input.stands.length,
    madeAt: now,
  };
}

/** All of one stand's sit: its half hours, its reasons, its ways in. */
export async function readSitDetail(
  scope: ClubScope,
  standId: string,
  ask: SitsAsk,
  now: number,
  options: ReadOptions = {},
): Promise<SitDetailView> {
  const { window, scoring, verdicts } = await rank(scope, { ...ask, standId, detail: 'full' }, now, options);
  const stand = scoring.input.stands.find((one) => one.id === standId);
  const verdict = verdicts[0];
  if (!stand || !verdict) throw notFound();
  const { club, member } = scope;
  const shaped = shapeDetail(verdict, {
    stand,
    window,
    approaches: scoring.input.approaches,
    seeSightings: maySeeSightings(member.role, club.rules, dayOf(now, club.zone)),
    declinationDeg: declinationDeg(club, window.startAt),
    now,
  });
  return { ...shaped, mayMap: scope.can('features.read') };
}
