import type { AgeClass, AgeMethod } from '@/core/harvest/harvest-types';
import type { MadeClub } from './build-club';
import type { DemoDay } from './demo-day';
import type { DemoRows } from './demo-rows';
import type { SitRow } from './sit-planner';

type LogRow = DemoRows['sitLogs'][number];
type HarvestRow = DemoRows['harvests'][number];

const MINUTE_MS = 60_000;
/** Field-dressed weight in kg about which a buck or doe of an age lies; invented, and ordinary for a middle latitude. */
const DRESSED_KG: Record<'buck' | 'doe', Partial<Record<AgeClass, number>>> = {
  buck: { fawn: 27, '1.5': 48, '2.5': 59, '3.5': 68 },
  doe: { fawn: 24, '1.5': 39, '2.5': 44, '3.5': 46 },
};
const AGES: readonly AgeClass[] = ['1.5', '1.5', '2.5', '2.5', '3.5'];
const BUCKS = 3;
const DOES = 4;

interface Shot {
  log: LogRow;
  sit: SitRow;
  shotAt: number;
}

/** Sits in which a deer of a kind was seen and no shot is written down yet, in no order, a member once. */
function shots(day: DemoDay, logs: LogRow[], sits: readonly SitRow[], saw: (log: LogRow) => boolean): Shot[] {
  const once = new Set<string>();
  return day.dice.shuffle(logs.filter(saw)).flatMap((log) => {
    const sit = sits.find(({ id }) => id === log.sitId);
    if (!sit || once.has(sit.memberId) || log.shot !== undefined) return [];
    once.add(sit.memberId);
    return [{ log, sit, shotAt: log.startAt + Math.floor((log.endAt - log.startAt) / 2 / MINUTE_MS) * MINUTE_MS }];
  });
}

function sheetOf(day: DemoDay, club: MadeClub, { sit, shotAt }: Shot, sex: 'buck' | 'doe'): HarvestRow {
  const { dice } = day;
  const [guest] = sit.guests.filter(() => sex === 'doe');
  const age = dice.pick(AGES);
  const ageMethod: AgeMethod = dice.chance(0.7) ? 'teeth' : 'body';
  const points = dice.whole(2, 5);
  const spread = dice.whole(280, 440);
  const buck = sex === 'buck';
  return {
    id: dice.id('harvest'),
    clubId: club.row.id,
    memberId: sit.memberId,
    guestName: guest?.name ?? '',
    guestId: guest?.memberId ?? null,
    sitId: sit.id,
    day: sit.day,
    takenAt: shotAt,
    standId: sit.standId,
    weapon: sit.weapon,
    sex,
    antlered: buck,
    age,
    ageMethod,
    dressedKg: dice.chance(0.85) ? Math.round(((DRESSED_KG[sex][age] ?? 40) + dice.whole(-4, 4)) * 10) / 10 : null,
    pointsLeft: buck ? points : null,
    pointsRight: buck ? points - (dice.chance(0.3) ? 1 : 0) : null,
    insideSpreadMm: buck ? spread : null,
    mainBeamLeftMm: buck ? spread + dice.whole(20, 60) : null,
    mainBeamRightMm: buck ? spread + dice.whole(20, 60) : null,
    lactating: buck ? null : dice.chance(0.6),
    requestKey: dice.requestKey(),
    writtenBy: sit.memberId,
    createdAt: shotAt + 240 * MINUTE_MS,
  };
}

/** Deer taken in the season, with the shot in the log of the sit; one hit deer was not found and one shot went over. */
export function buildHarvests(day: DemoDay, club: MadeClub, logs: LogRow[], sits: readonly SitRow[]): HarvestRow[] {
  const recovered = (shot: Shot, hitPlace: 'heart_lungs' | 'elsewhere'): Shot => {
    Object.assign(shot.log, { shot: 'hit', shotAt: shot.shotAt, hitPlace, followUp: 'recovered' });
    return shot;
  };
  const bucks = shots(day, logs, sits, (log) => log.antleredBucks > 0).slice(0, BUCKS);
  const sheets = bucks.map((shot) => sheetOf(day, club, recovered(shot, 'heart_lungs'), 'buck'));
  const [lost, over, ...does] = shots(day, logs, sits, (log) => log.does > 0);
  if (lost) {
    const followUpNotes = 'Stood on the two-track, last seen at the creek. Blood for 80 yards, then none.';
    const followed = { hitPlace: 'elsewhere', followUp: 'not_found', followUpNotes };
    Object.assign(lost.log, { shot: 'hit', shotAt: lost.shotAt, ...followed });
  }
  if (over) Object.assign(over.log, { shot: 'missed', shotAt: over.shotAt });
  sheets.push(...does.slice(0, DOES).map((shot) => sheetOf(day, club, recovered(shot, 'elsewhere'), 'doe')));
  return sheets;
}

/** One member counted again a day later: the log keeps what it said first. */
export function buildLogVersions(day: DemoDay, logs: LogRow[], sits: readonly SitRow[]): DemoRows['sitLogVersions'] {
  const log = logs.find(({ unknown, shot }) => unknown > 0 && shot === undefined);
  const sit = sits.find(({ id }) => id === log?.sitId);
  if (!log || !sit) return [];
  const { sitId, clubId, createdAt, ...facts } = log;
  const first = {
    bumpedWhere: '',
    shot: 'none' as const,
    shotAt: null,
    hitPlace: null,
    followUp: null,
    followUpNotes: '',
    notes: '',
    ...facts,
    unknown: 0,
    version: 1,
    savedBy: sit.memberId,
    updatedAt: null,
  };
  Object.assign(log, { version: 2, savedBy: sit.memberId, updatedAt: createdAt + 60 * MINUTE_MS });
  return [
    { id: day.dice.id('logVersion'), clubId, sitId, version: 1, savedBy: sit.memberId, savedAt: createdAt, log: first },
  ];
}
