import { frameGround } from '@/core/ground-frame';
import { gridAbout, momentAt, walkInStretches } from '@/core/moment';
import { frameSits, type SitFrame } from '@/core/sit-frame';
import { judgeSit } from '@/core/verdict';
import type { Verdict } from '@/core/verdict-types';
import { sitWindow } from '@/core/windows';
import { listBookedSits } from '@/features/ground/people-data';
import { loadForecast } from '@/features/sits/load-forecast';
import { loadScoring } from '@/features/sits/load-scoring';
import type { ReadOptions } from '@/features/sits/reads';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { MomentAsk } from './ask-moment';
import type { MomentView } from './moment-types';
import { scentBands } from './scent-bands';
import { positionOf, stretchView } from './stretch-view';

/** Metres a cell of the scent field is wide, and how far from the stand it is drawn: the eye asks no more of a club's map. */
const CELL_M = 20;
const MOST_M = 640;

/** Everything the map lays over the ground for one half hour of one sit. */
export async function readMoment(
  scope: ClubScope,
  ask: MomentAsk,
  now: number,
  options: Pick<ReadOptions, 'forecast'> = {},
): Promise<MomentView> {
  const { club } = scope;
  const window = sitWindow(ask.day, ask.window, club.rules, club);
  const { input, rows } = await loadScoring(scope, { day: ask.day, until: window.startAt, weapon: null }, now);
  const row = rows.stands.find((stand) => stand.id === ask.stand);
  if (!row) throw notFound();
  const stands = input.stands.filter((stand) => stand.id === row.id);
  const { forecast } = options.forecast ?? (await loadForecast(scope, now));
  const ground = frameGround({ ...input, stands });
  const [stand] = ground.stands;
  if (!stand) throw notFound();
  const frame = frameSits(ground, window, forecast, now, 'full');
  const steps = frame.window.stepAts;
  const step = Math.min(ask.step, steps.length - 1);
  const moment = momentAt(frame, stand, step, gridAbout(stand, input.settings.scent.reachM, CELL_M, MOST_M));
  if (!moment) throw notFound();
  const verdict = judgeSit(frame, stand, []);
  const line = verdict.timeline[step];
  const most = input.features.find((feature) => feature.id === line?.windedFeatureId)?.name ?? null;
  const sits = await listBookedSits(scope, { standId: null, fromDay: ask.day, toDay: ask.day, now });
  return {
    stand: { id: row.id, name: row.name, at: [row.lon, row.lat] },
    window,
    steps,
    step,
    at: moment.at,
    wind: moment.wind,
    bands: moment.field ? scentBands(club, moment.field) : [],
    winded: line && line.windedChance !== null ? { chance: line.windedChance, most } : null,
    sun: { ...moment.sun, inEyes: line?.sunInEyes ?? false },
    way: wayView(scope, frame, verdict),
    sitters: sits.flatMap((sit) => {
      if (sit.windows !== 'all_day' && sit.windows !== ask.window) return [];
      const at = rows.stands.find((one) => one.id === sit.standId);
      return at ? [{ standId: at.id, standName: at.name, at: [at.lon, at.lat], name: sit.memberName }] : [];
    }),
    forecast: moment.wind ? (forecast?.source ?? null) : null,
  };
}

function wayView(scope: ClubScope, frame: SitFrame, verdict: Verdict): MomentView['way'] {
  const way = verdict.approach;
  const { approaches, features } = frame.ground.input;
  const approach = way && approaches.find((one) => one.id === way.approachId);
  if (!way || !approach) return null;
  return {
    name: way.approachName,
    leaveBy: way.leaveBy,
    inBy: way.inBy,
    inChance: way.inChance,
    stretches: walkInStretches(frame, way, approach).map((stretch) =>
      stretchView(stretch, (p) => positionOf(scope.club, p), features),
    ),
  };
}
