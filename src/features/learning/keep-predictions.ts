import { WINDOW_NAMES } from '@/core/condition-types';
import { rankSits } from '@/core/rank';
import { sitWindow } from '@/core/windows';
import { write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { windowsHeld } from '@/features/bookings/words/sits';
import { loadScoring } from '@/features/sits/load-scoring';
import { getForecast, type KeptForecast } from '@/features/weather/get-forecast';
import { type ClubScope, systemScopeById } from '@/server/scope';
import { insertPrediction, listUnpredicted, type UnpredictedSit } from './learning-data';

const HOUR_MS = 3_600_000;
/** A sit that began longer ago was missed: what a later forecast says of it is no prediction. */
const LATEST_MS = 3 * HOUR_MS;
/** Judged as somebody would who sets out, so that every way in is still open. */
const SET_OUT_MS = 2 * HOUR_MS;

export type ForecastOf = (scope: ClubScope, now: number) => Promise<KeptForecast>;

const keptForecast: ForecastOf = ({ club: { lat, lon } }, now) => getForecast({ lat, lon }, now);

/** What is thought of a sit in its louder window, and the adjustment in it; null: the forecast does not reach it. */
async function predict(scope: ClubScope, sit: UnpredictedSit, kept: KeptForecast) {
  const { club } = scope;
  const held = windowsHeld(sit.windows);
  const found: { quiet: number; adjustedBy: number; score: number; windFromDeg: number | null }[] = [];
  for (const name of WINDOW_NAMES.filter((one) => held.includes(one))) {
    const window = sitWindow(sit.day, name, club.rules, club);
    const now = window.startAt - SET_OUT_MS;
    const { input } = await loadScoring(scope, { day: sit.day, until: now, weapon: sit.weapon }, now);
    const stands = input.stands.filter(({ id }) => id === sit.standId);
    const gatesByStand = new Map();
    const [verdict] = rankSits({
      ...input,
      stands,
      window,
      forecast: kept.forecast,
      gatesByStand,
      now,
      detail: 'list',
    });
    if (!verdict?.arcHold && verdict?.windedChance === null) return null;
    if (verdict) {
      const { quiet, score, meanFromDeg: windFromDeg = null } = verdict;
      found.push({ quiet, adjustedBy: stands[0]?.quietShift ?? 0, score, windFromDeg });
    }
  }
  return found.sort((a, b) => a.quiet - b.quiet)[0] ?? null;
}

/** Keeps what is thought of each sit as its window begins, once, to be held against its log. */
export async function keepPredictions(now: number, forecastOf: ForecastOf = keptForecast): Promise<{ kept: number }> {
  let count = 0;
  for (const club of await listClubs()) {
    const scope = await systemScopeById(club.id);
    const due = await listUnpredicted(scope, { from: now - LATEST_MS, until: now });
    if (due.length === 0) continue;
    const kept = await forecastOf(scope, now);
    if (!kept.forecast) continue;
    for (const sit of due) {
      const thought = await predict(scope, sit, kept);
      if (!thought) continue;
      const row = { sitId: sit.id, clubId: club.id, standId: sit.standId, ...thought, at: now };
      if (await write((tx) => insertPrediction(tx, row))) count++;
    }
  }
  return { kept: count };
}
