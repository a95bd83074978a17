import { apartDeg, normalizeDeg } from '../angles';
import { formatClock, formatClock12, formatMonth, localToUtc } from '../day-time';
import type { ScoredStand } from '../ground-types';
import { sunInEyes } from '../promise/sun-in-eyes';
import { sectorName } from '../sectors';
import { sunPosition } from '../sun';
import { makeFinding, standFacts } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { canShoot, isAttraction, isLine, shotOf, windowsHunted } from './shot-of';
import { SUN_WORDS } from './words/sun';

const STEP_MS = 5 * 60_000;
/** Sun in the eyes less than this (0-1) troubles nobody. */
const TROUBLES = 0.3;

interface Moment {
  at: number;
  altitudeDeg: number;
  azimuthDeg: number;
}

/** The low sun of some spans, one list a day. */
function lowSun(spans: { startAt: number; endAt: number }[], input: SetupInput, upToDeg: number): Moment[][] {
  return spans.map(({ startAt, endAt }) => {
    const out: Moment[] = [];
    for (let at = startAt; at < endAt; at += STEP_MS) {
      const sun = sunPosition(at, input.place.lat, input.place.lon);
      if (sun.altitudeDeg > -0.3 && sun.altitudeDeg < upToDeg) out.push({ at, ...sun });
    }
    return out;
  });
}

interface SunSpell {
  /** Indexes of the days troubled. */
  days: number[];
  moments: Moment[];
  most: number;
}

function spell(days: Moment[][], blinds: (m: Moment) => boolean, settings: SetupInput['settings']): SunSpell {
  const found = days.map((moments) => moments.filter(blinds));
  const long = found
    .map((m, i) => ({ i, minutes: m.length * 5 }))
    .filter(({ minutes }) => minutes >= settings.sunMinutes);
  const troubled = long.length >= Math.min(settings.sunMonths, days.length) ? long : [];
  return {
    days: troubled.map(({ i }) => i),
    moments: troubled.flatMap(({ i }) => found[i] ?? []),
    most: Math.max(0, ...troubled.map(({ minutes }) => minutes)),
  };
}

/** What is turned to is to be free of the sun in every month. */
const anyMonth = (settings: SetupInput['settings']) => ({ ...settings, sunMonths: 1 });

function nearestFree(facingDeg: number, free: (deg: number) => boolean): number | null {
  for (let turn = 5; turn <= 180; turn += 5) {
    for (const deg of [normalizeDeg(facingDeg - turn), normalizeDeg(facingDeg + turn)]) if (free(deg)) return deg;
  }
  return null;
}

function whenText(moments: Moment[], days: string[], input: SetupInput): string {
  const clocks = moments.map((m) => formatClock(m.at, input.place.zone)).sort();
  const first = moments.find((m) => formatClock(m.at, input.place.zone) === clocks[0]);
  const last = moments.find((m) => formatClock(m.at, input.place.zone) === clocks.at(-1));
  const clock = (at: number) =>
    input.units === 'us' ? formatClock12(at, input.place.zone) : formatClock(at, input.place.zone);
  return SUN_WORDS.when(first ? clock(first.at) : '', last ? clock(last.at) : '', days.map(formatMonth));
}

const directionText = (deg: number) => `${Math.round(deg)}° (${sectorName(deg)})`;

/** Whether a seat turned to a direction still has in shot all that draws deer to it now. */
function keepsInShot(stand: ScoredStand, input: SetupInput): (deg: number) => boolean {
  const worth = input.features.filter((f) => (isAttraction(f) || isLine(f)) && canShoot(shotOf(stand, f.shape, input)));
  return (facingDeg) => worth.every((f) => canShoot(shotOf({ ...stand, facingDeg }, f.shape, input)));
}

/** Seats that look into the low sun in a window they are hunted in. Dense wood screens it off. */
export function findSeatSun(input: SetupInput): Finding[] {
  const { promise } = input.scoring;
  const low = (['morning', 'evening'] as const).map((name) => {
    const windows = input.windows.filter(({ window }) => window === name);
    return { name, windows, days: lowSun(windows, input, promise.sunAltitudeDeg) };
  });
  const blinds = (deg: number) => (m: Moment) => sunInEyes(deg, m.altitudeDeg, m.azimuthDeg, promise) >= TROUBLES;
  return input.stands.flatMap((stand) => {
    const facing = stand.facingDeg;
    if (facing === null || stand.shelter === 'dense_wood') return [];
    const hunted = low.filter(({ name }) => windowsHunted(stand).includes(name));
    const spells = hunted.map((one) => ({ ...one, spell: spell(one.days, blinds(facing), input.settings) }));
    const worst = spells.filter((s) => s.spell.most > 0).sort((a, b) => b.spell.most - a.spell.most)[0];
    if (!worst) return [];
    const keeps = keepsInShot(stand, input);
    const free = (deg: number) =>
      keeps(deg) && hunted.every((one) => spell(one.days, blinds(deg), anyMonth(input.settings)).days.length === 0);
    const better = nearestFree(facing, free);
    const when = whenText(
      worst.spell.moments,
      worst.spell.days.map((i) => worst.windows[i]?.day ?? ''),
      input,
    );
    const betterText = better === null ? null : directionText(better);
    return [
      makeFinding(
        {
          code: 'seat_sun',
          subject: { of: 'stand', id: stand.id, name: stand.name },
          stand: { id: stand.id, name: stand.name },
          at: stand.at,
          distanceM: null,
          bearingDeg: facing,
          text: SUN_WORDS.seat(stand.name, worst.name, when),
          why: SUN_WORDS.whySeat(worst.spell.most, worst.name, betterText),
          acts: [
            ...(betterText === null
              ? []
              : [{ act: 'turn' as const, text: SUN_WORDS.turn(stand.name, betterText), work: null }]),
            { act: 'block', text: SUN_WORDS.brushIn(stand.name, worst.name), work: 'cutting' },
          ],
          trial:
            better === null ? null : { change: 'facing', standId: stand.id, facingDeg: better, window: worst.name },
        },
        [standFacts(stand)],
      ),
    ];
  });
}

const wholeDays = (days: string[], zone: string) =>
  days.map((day) => ({ startAt: localToUtc(day, '00:00', zone), endAt: localToUtc(day, '23:59', zone) }));

/** Cameras that look into the low sun: which hours and months, and the bearing nearest theirs that avoids it. */
export function findCameraSun(input: SetupInput): Finding[] {
  const { settings } = input;
  const days = lowSun(wholeDays(input.days, input.place.zone), input, settings.cameraSunDeg);
  const blinds = (deg: number) => (m: Moment) => apartDeg(deg, m.azimuthDeg) < settings.cameraTurnDeg;
  return input.cameras.flatMap((camera) => {
    const facing = camera.facingDeg;
    if (facing === null) return [];
    const found = spell(days, blinds(facing), settings);
    if (found.days.length === 0) return [];
    const better = nearestFree(facing, (deg) => spell(days, blinds(deg), anyMonth(settings)).days.length === 0);
    const name = camera.name || SUN_WORDS.unnamedCamera;
    const when = whenText(
      found.moments,
      found.days.map((i) => input.days[i] ?? ''),
      input,
    );
    const to = better === null ? SUN_WORDS.anotherWay : directionText(better);
    return [
      makeFinding(
        {
          code: 'camera_sun',
          subject: { of: 'camera', id: camera.id, name },
          stand: null,
          at: camera.at,
          distanceM: null,
          bearingDeg: facing,
          text: SUN_WORDS.camera(name, when),
          why: SUN_WORDS.whyCamera(to),
          acts: [{ act: 'turn', text: SUN_WORDS.turn(name, to), work: null }],
          trial: null,
        },
        [camera.id, Math.round(camera.at.eastM), Math.round(camera.at.northM), facing],
      ),
    ];
  });
}
