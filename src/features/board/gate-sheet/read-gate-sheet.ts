import { weaponWord } from '@/core/booking/seasons';
import { addDays, formatDay } from '@/core/day-time';
import { legalLight } from '@/core/legal-light';
import { sunTimes } from '@/core/sun';
import { allDayWindows } from '@/core/windows';
import { listBookedSits, type SitDetail } from '@/features/bookings/data';
import { clockText, SIT_WINDOW_WORDS, spanText } from '@/features/bookings/words/sits';
import { listApproaches } from '@/features/ground/approaches-data';
import { listClosuresFrom } from '@/features/ground/closures-data';
import { listMapItems } from '@/features/ground/map-items-data';
import { listParkings } from '@/features/ground/parkings-data';
import { listStands } from '@/features/ground/stands-data';
import { listOutingsOf } from '@/features/outings/data';
import { expectedBackBy } from '@/features/outings/walk-out';
import { loadForecast } from '@/features/sits/load-forecast';
import { ageText, legalLightText } from '@/features/sits/words/terms';
import type { ClubScope } from '@/server/scope';
import { GATE_DAY_WORDS as WORDS } from '../words/gate-sheet';
import { type HourWind, hourWinds } from './hour-winds';
import { type Sketch, sketchGround } from './sketch-ground';

const HOUR_MS = 3_600_000;

export interface GateSit {
  id: string;
  standNumber: number;
  standName: string;
  who: string;
  guests: string;
  windowText: string;
  timeText: string;
  weapon: string;
  parking: string;
  wayIn: string;
  backBy: string;
}

export interface GateStand {
  id: string;
  number: number;
  name: string;
  state: 'free' | 'booked' | 'closed';
}

export interface GateSheet {
  clubName: string;
  day: string;
  dayText: string;
  before: string;
  after: string;
  madeText: string;
  sits: GateSit[];
  /** Closed all or some of the day, with the reason. */
  closed: string[];
  sun: string;
  /** One line a rule, each with its source and date. */
  light: string[];
  winds: (HourWind & { clock: string })[];
  /** How old the forecast is, or that there is none. */
  forecastText: string;
  /** Null for those who may not know where the stands are. */
  ground: { sketch: Sketch; stands: GateStand[] } | null;
}

const shortHour = (text: string) => text.replace(':00', '');

function sunText(scope: ClubScope, day: string): string {
  const { club } = scope;
  const { rise, set, civilDawn, civilDusk, polar } = sunTimes(day, club.zone, club.lat, club.lon);
  if (polar === 'up_all_day') return WORDS.neverSets;
  if (polar === 'down_all_day' || rise === null || set === null) return WORDS.neverRises;
  const say = (at: number | null) => (at === null ? '–' : clockText(at, club));
  return WORDS.sun({ rise: say(rise), set: say(set), dawn: say(civilDawn), dusk: say(civilDusk) });
}

function lightLines(scope: ClubScope, day: string): string[] {
  const { club } = scope;
  return club.rules.legalLight.flatMap((rule) => {
    const span = legalLight(rule, day, club);
    return span ? [WORDS.light(rule.name, spanText(span.startAt, span.endAt, club), legalLightText(rule))] : [];
  });
}

async function loadDay(scope: ClubScope, day: string) {
  const [sits, stands, ways, parkings, closures] = await Promise.all([
    listBookedSits(scope, { fromDay: day, toDay: day }),
    listStands(scope),
    listApproaches(scope),
    listParkings(scope),
    listClosuresFrom(scope, day),
  ]);
  const outings = await listOutingsOf(
    scope,
    sits.map(({ id }) => id),
  );
  return { sits, stands, ways, parkings, closures: closures.filter(({ fromDay }) => fromDay <= day), outings };
}

type Day = Awaited<ReturnType<typeof loadDay>>;

function gateSit(scope: ClubScope, day: Day, sit: SitDetail): GateSit {
  const { club } = scope;
  const outing = day.outings.find(({ sitId, signedOutAt }) => sitId === sit.id && signedOutAt === null);
  const way = day.ways.find(({ id }) => id === (outing?.approachId ?? sit.approachId));
  const parking = day.parkings.find(({ id }) => id === (outing?.parkingId ?? way?.parkingId));
  const guests = sit.guests.map(({ name }) => name).join(', ');
  return {
    id: sit.id,
    standNumber: day.stands.findIndex(({ id }) => id === sit.standId) + 1,
    standName: sit.standName,
    who: sit.memberName,
    guests,
    windowText: SIT_WINDOW_WORDS[sit.windows],
    timeText: spanText(sit.startAt, sit.endAt, club),
    weapon: weaponWord(sit.weapon),
    parking: parking?.name ?? '',
    wayIn: way?.name ?? '',
    backBy: clockText(outing?.backBy ?? expectedBackBy(club, day.ways, sit), club),
  };
}

async function groundOf(scope: ClubScope, day: Day): Promise<GateSheet['ground']> {
  const items = (await listMapItems(scope)).flatMap(({ layer, geometry }) => {
    if (layer !== 'boundary' && layer !== 'road') return [];
    if (geometry.type === 'LineString') return [{ kind: layer, points: geometry.coordinates, closed: false }];
    if (geometry.type !== 'Polygon') return [];
    return geometry.coordinates.map((points) => ({ kind: layer, points, closed: true }));
  });
  const sketch = sketchGround({
    centre: scope.club,
    units: scope.club.units,
    stands: day.stands.map(({ id, lat, lon }) => ({ id, lat, lon })),
    parkings: day.parkings.map(({ name, lat, lon }) => ({ name, lat, lon })),
    lines: [...items, ...day.ways.map(({ points }) => ({ kind: 'way' as const, points, closed: false }))],
  });
  if (!sketch) return null;
  const wholeGround = day.closures.some(({ standId }) => standId === null);
  const stands = day.stands.map(({ id, name }, index): GateStand => {
    const closed = wholeGround || day.closures.some(({ standId }) => standId === id);
    const booked = day.sits.some(({ standId }) => standId === id);
    return { id, number: index + 1, name, state: closed ? 'closed' : booked ? 'booked' : 'free' };
  });
  return { sketch, stands };
}

/** All that hangs at the gate on a day: it has to serve where no phone does. */
export async function readGateSheet(scope: ClubScope, day: string, now: number): Promise<GateSheet> {
  const { club } = scope;
  const loaded = await loadDay(scope, day);
  const kept = await loadForecast(scope, now);
  const [morning, evening] = allDayWindows(day, club.rules, club);
  const span = {
    startAt: (morning?.startAt ?? now) - HOUR_MS,
    endAt: (evening?.endAt ?? now) + HOUR_MS,
  };
  const winds = hourWinds(kept.forecast, span, club.units);
  const known = kept.ageMs === null ? null : WORDS.fetched(ageText(kept.ageMs));
  const names = new Map(loaded.stands.map(({ id, name }) => [id, name]));
  return {
    clubName: club.name,
    day,
    dayText: formatDay(day, true),
    before: addDays(day, -1),
    after: addDays(day, 1),
    madeText: WORDS.made(clockText(now, club)),
    sits: loaded.sits.map((sit) => gateSit(scope, loaded, sit)),
    closed: loaded.closures.map(({ standId, reason, toDay }) => {
      const what = standId === null ? WORDS.wholeGround : (names.get(standId) ?? WORDS.someStand);
      return WORDS.closed(what, reason, toDay === null ? null : formatDay(toDay));
    }),
    sun: sunText(scope, day),
    light: lightLines(scope, day),
    winds: winds.map((wind) => ({ ...wind, clock: shortHour(clockText(wind.at, club)) })),
    forecastText: winds.length > 0 ? (known ?? '') : WORDS.noForecast,
    ground: scope.can('stands.read') ? await groundOf(scope, loaded) : null,
  };
}
