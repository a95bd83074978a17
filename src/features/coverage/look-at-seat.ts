import { dayOf } from '@/core/day-time';
import { toLocal } from '@/core/geometry';
import type { GoodWindArc, ScoredStand } from '@/core/ground-types';
import { cropYearOf } from '@/core/map-layers';
import { sectorName } from '@/core/sectors';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { judgeUsual } from '@/core/setup-check/weigh-finding';
import { ydToM } from '@/core/units';
import { allDayWindows } from '@/core/windows';
import { wordFor } from '@/core/word';
import { loadGround } from '@/features/ground/data';
import { featuresInYear } from '@/features/ground/features-in-year';
import { groundToCore } from '@/features/ground/to-core';
import type { ClubScope } from '@/server/scope';
import { type TrialSeatAsk, trialArcs, trialSuitability } from './coverage-schema';
import { loadSeasonHours } from './load-season-hours';
import { usualWinds } from './usual-winds';
import { TRIAL_MAP_WORDS, TRIAL_WORDS as W } from './words';

/** A middling hang-on: what stands there is not known yet. */
function trialStand(ask: TrialSeatAsk, arcs: GoodWindArc[], scope: ClubScope): ScoredStand {
  return {
    id: 'trial',
    name: TRIAL_MAP_WORDS.name,
    kind: 'hang_on',
    at: toLocal(scope.club, ask),
    seatHeightM: 5,
    facingDeg: null,
    shotSide: 'either',
    shotRangeM: { bow: ydToM(30) },
    shelter: 'open_wood',
    arcs,
    suitability: trialSuitability(ask.window),
    restDays: 0,
    drainBearingDeg: null,
    slopePercent: null,
  };
}

/** What the scoring core says of a trial's seat where it is placed, on the commonest of its winds; null: it has no winds to sit on. */
export async function lookAtSeat(scope: ClubScope, ask: TrialSeatAsk, now: number): Promise<{ text: string | null }> {
  const { club } = scope;
  const read = trialArcs(ask.trial);
  if (!read.ok || read.arcs.length === 0) return { text: null };
  const season = await loadSeasonHours(scope, now);
  const rows = await loadGround(scope);
  const features = featuresInYear(rows.features, cropYearOf(dayOf(now, club.zone)));
  const core = groundToCore(club, { ...rows, features });
  const place = { lat: club.lat, lon: club.lon, zone: club.zone };
  const windows = allDayWindows(dayOf(now, club.zone), club.rules, place);
  const bare = { events: [], sightings: [], settings: DEFAULT_SETTINGS, weapon: null, units: club.units };
  const trial = trialStand(ask, read.arcs, scope);
  const found = judgeUsual(trial, { place, ...core, approaches: [], ...bare }, windows, usualWinds(season, club));
  if (!found) return { text: null };
  const when = W.when(sectorName(found.windFromDeg), found.window);
  return { text: W.seat(wordFor(found.quiet), when, Math.round(found.quiet), Math.round(found.promise)) };
}
