import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Forecast, WeatherHour } from '@/core/types';
import { write } from '@/db/client';
import { sitLogs, visits } from '@/db/schema';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { loadEvents, loadSightings } from '@/features/sits/load-scoring';
import { readWeek } from '@/features/sits/read-week';
import { readSitDetail, readSits, type SitsAsk } from '@/features/sits/reads';
import { ensureForecast } from '@/features/weather/ensure-forecast';
import type { KeptForecast } from '@/features/weather/get-forecast';
import { newId } from '@/lib/ids';
import { setClock } from '@/server/clock';
import { GET as getDetail } from '../../src/app/api/clubs/[club]/sits/[stand]/route';
import { GET as getSits } from '../../src/app/api/clubs/[club]/sits/route';
import { GET as getWeek } from '../../src/app/api/clubs/[club]/week/route';
import { addApproach, addFeature } from '../helpers/add-ground';
import { book, refusal, SATURDAY } from '../helpers/book';
import {
  addMember,
  addStand,
  makeClub,
  TEST_NOW,
  TEST_PLACE,
  type TestClub,
  type TestMember,
} from '../helpers/make-club';
import { inRequest } from '../helpers/request';

const HOUR = 3_600_000;
const DAY = 24 * HOUR;
const MORNING: SitsAsk = { day: SATURDAY, window: 'morning' };

/** A steady wind for ten days. */
function steady(fromDeg: number, over: Partial<WeatherHour> = {}): KeptForecast {
  const start = Math.floor(TEST_NOW / HOUR) * HOUR - 6 * HOUR;
  const hours = Array.from(
    { length: 240 },
    (_, i): WeatherHour => ({
      at: start + i * HOUR,
      windFromDeg: fromDeg,
      windSpeedMps: 4,
      gustMps: 6,
      tempC: 4,
      pressureHpa: 1018,
      precipMm: 0,
      cloudPercent: 100,
      radiationWm2: null,
      thunder: false,
      ...over,
    }),
  );
  const forecast: Forecast = { issuedAt: TEST_NOW, fetchedAt: TEST_NOW, source: 'made up', hours, members: [] };
  return { forecast, ageMs: 0, stale: false, error: null };
}

const near = (north: number, east = 0) => ({ lat: TEST_PLACE.lat + north, lon: TEST_PLACE.lon + east });

let club: TestClub;
let ann: TestMember;
let bert: TestMember;
let west: string;
let east: string;
const list = (who: TestMember, ask: SitsAsk = MORNING, kept = steady(270)) =>
  readSits(who.scope, ask, TEST_NOW, { forecast: kept });

beforeAll(() => setClock(() => TEST_NOW));
beforeEach(async () => {
  club = await makeClub();
  ann = await addMember(club, 'member', { name: 'Ann Roe' });
  bert = await addMember(club, 'member', { name: 'Bert Hale' });
  west = await addStand(club, { name: 'West Oak', ...near(0.002), arcs: [{ fromDeg: 225, toDeg: 315, window: null }] });
  east = await addStand(club, {
    name: 'East Oak',
    ...near(0.006, -0.004),
    arcs: [{ fromDeg: 45, toDeg: 135, window: null }],
  });
  await addApproach(club, west, near(0.002), 'Creek way');
  await addApproach(club, east, near(0.006, -0.004), 'Ridge way');
  await addFeature(club, 'Hidden Hollow', 'bedding', near(0.002, 0.003));
});

describe('the ranked list', () => {
  it('puts the stand with the right wind first, and turns with the wind', async () => {
    const inWest = await list(ann);
    expect(inWest.open.map(({ rank, name }) => [rank, name])).toEqual([
      [1, 'West Oak'],
      [2, 'East Oak'],
    ]);
    expect(inWest.open[0]?.sentence).toMatch(/^W holds \d+ %; walk in by Creek way, in by \d/);
    expect(inWest.open[1]?.sentence).toMatch(/^W is the wrong wind/);
    expect(inWest.open[0]?.shares).toHaveLength(72);
    const inEast = await list(ann, MORNING, steady(90));
    expect(inEast.open.map(({ name }) => name)).toEqual(['East Oak', 'West Oak']);
  });

  it('is the next window that is worth walking in for, unless asked otherwise', async () => {
    // TEST_NOW is 10:00 at the club, an hour before the morning ends.
    expect((await list(ann, {})).window).toMatchObject({ day: '2026-11-04', window: 'evening' });
    expect((await list(ann, { day: '2026-11-09' })).window).toMatchObject({ day: '2026-11-09', window: 'morning' });
  });

  it('names the rule, its holder and its end for what is not open', async () => {
    await book(bert, west);
    const { open, blocked } = await list(ann);
    expect(open.map(({ name }) => name)).toEqual(['East Oak']);
    expect(blocked[0]).toMatchObject({ name: 'West Oak', gates: [{ code: 'taken' }] });
    expect(blocked[0]?.gates[0]?.text).toContain('Bert Hale');
    const monday = await list(ann, { day: '2026-11-09', window: 'morning' });
    expect(monday.blocked[0]?.gates[0]).toMatchObject({ code: 'resting', ends: 'Open again Wed 11 Nov' });
  });

  it('shows one’s own sit and where it could be moved, and opens again when it is cancelled', async () => {
    const sit = await book(ann, west, { windows: 'all_day' });
    const mine = await list(ann);
    expect(mine.mine).toMatchObject({ sitId: sit.id, standName: 'West Oak', windows: 'all_day', sequence: 0 });
    expect(mine.open.map(({ name, mine: own }) => [name, own])).toEqual([
      ['West Oak', true],
      ['East Oak', false],
    ]);
    await cancelSit(ann.scope, { sitId: sit.id, reason: '' }, TEST_NOW);
    expect((await list(ann)).mine).toBeNull();
  });

  it('says which stands are not for a weapon', async () => {
    await addStand(club, { name: 'Bow Nook', ...near(0.01), shotRangeM: { bow: 25 } });
    const { blocked, weapons } = await list(ann, { ...MORNING, weapon: 'rifle' });
    expect(weapons).toEqual(['bow', 'rifle']);
    expect(blocked.map(({ name, gates }) => [name, gates[0]?.code])).toEqual([['Bow Nook', 'weapon']]);
  });

  it('states the legal light as the club’s rule', async () => {
    const rule = {
      name: 'Deer',
      minutesBeforeSunrise: 30,
      minutesAfterSunset: 30,
      source: 'Hunting digest',
      statedOn: '2026-08-01',
    };
    const strict = await makeClub({ legalLight: [rule] });
    const member = await addMember(strict);
    const { light, sky } = await list(member);
    expect(light?.text).toContain('Club rule: 30 min before sunrise to 30 min after sunset (Hunting digest');
    expect(Math.abs((sky.rise ?? 0) - 30 * 60_000 - (light?.startAt ?? 0))).toBeLessThan(60_000);
    expect((await list(ann)).light).toBeNull();
  });

  it('has nothing to rank in a club without stands', async () => {
    const empty = await addMember(await makeClub());
    expect(await list(empty)).toMatchObject({ standCount: 0, open: [], blocked: [], mine: null });
  });
});

describe('the forecast', () => {
  it('may be missing: the list stands on arcs, rest and the way in', async () => {
    const none = await list(ann, MORNING, { forecast: null, ageMs: null, stale: false, error: 'The service is down.' });
    expect(none.forecast).toMatchObject({ state: 'none', error: 'The service is down.' });
    expect(none.weather).toBeNull();
    expect(none.open).toHaveLength(2);
    for (const row of none.open) {
      expect(row).toMatchObject({ confidence: 'none', shares: null, hold: null });
      expect(Number.isFinite(row.score)).toBe(true);
      expect(row.sentence).toMatch(/^No forecast; walk in by/);
    }
  });

  it('says so when it is old, and when it does not reach the window', async () => {
    expect((await list(ann, MORNING, { ...steady(270), stale: true })).forecast.state).toBe('stale');
    const later = await list(ann, { day: '2026-12-20', window: 'evening' });
    expect(later.forecast.state).toBe('beyond');
    expect(later.open[0]?.confidence ?? later.blocked[0]?.confidence).toBe('none');
  });

  it('lowers certainty when the wind is variable', async () => {
    const settled = await list(ann);
    const variable = await list(ann, MORNING, steady(270, { windFromDeg: null, windSpeedMps: 1.5 }));
    expect(settled.open[0]?.confidence).not.toBe('low');
    expect(variable.open[0]?.confidence).toBe('low');
  });

  it('is fetched from the weather that is set, and kept for the next reader', async () => {
    await ensureForecast(TEST_PLACE, TEST_NOW, { waitMs: 60_000 });
    const view = await readSits(ann.scope, { day: '2026-11-05', window: 'morning' }, TEST_NOW);
    expect(view.forecast).toMatchObject({ state: 'fresh', source: 'Made weather (no real forecast)' });
    expect(view.weather?.wind).toMatch(/mph/);
  });

  it('warns once of thunder over the whole ground', async () => {
    const view = await list(ann, MORNING, steady(270, { thunder: true }));
    expect(view.cautions.map(({ code, level }) => [code, level])).toEqual([['thunder', 'stop']]);
    expect(view.open.flatMap((row) => row.cautions).filter(({ code }) => code === 'thunder')).toEqual([]);
  });
});

describe('an opened row', () => {
  it('has half hours, reasons, ways and what would change it, scored as in the list', async () => {
    const row = (await list(ann)).open[0];
    const detail = await readSitDetail(ann.scope, west, MORNING, TEST_NOW, { forecast: steady(270) });
    expect(detail).toMatchObject({ score: row?.score, quiet: row?.quiet, promise: row?.promise, word: row?.word });
    expect(detail.timeline.length).toBeGreaterThan(8);
    for (const step of detail.timeline) {
      expect((step.shares ?? []).reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 1);
    }
    const sizes = detail.reasons.map((reason) => Math.abs(reason.change));
    expect(sizes.length).toBeGreaterThan(1);
    expect(sizes).toEqual([...sizes].sort((a, b) => b - a));
    expect(detail.ways[0]).toMatchObject({ name: 'Creek way', parkingName: 'Creek way lot', bearingDeg: 0, cost: 0 });
    expect(detail.ways.slice(1).every((way) => way.cost <= 0)).toBe(true);
    expect(detail.cautions.map((caution) => caution.code)).toContain('harness');
    expect(JSON.stringify(detail)).toContain('Hidden Hollow');
  });

  it('is nothing for a stand of another club', async () => {
    const other = await addStand(await makeClub());
    expect((await refusal(readSitDetail(ann.scope, other, MORNING, TEST_NOW, { forecast: steady(0) }))).code).toBe(
      'not_found',
    );
  });
});

describe('a guest', () => {
  it('gets the same ranking without names of features and without positions', async () => {
    const guest = await addMember(club, 'guest', { sponsorId: ann.id, guestFrom: '2026-11-01', guestTo: '2026-11-30' });
    const kept = steady(270);
    const [own, full] = [await list(guest), await list(ann)];
    expect(own.open.map(({ name, score }) => [name, score])).toEqual(full.open.map(({ name, score }) => [name, score]));
    const detail = await readSitDetail(guest.scope, west, MORNING, TEST_NOW, { forecast: kept });
    const week = await readWeek(guest.scope, {}, TEST_NOW, { forecast: kept });
    const told = JSON.stringify([own, detail, week]);
    expect(told).toContain('a bedding area');
    expect(told).not.toContain('Hidden Hollow');
    expect(told).not.toMatch(/"(lat|lon|eastM|northM|points)"/);
    expect(told).not.toContain(TEST_PLACE.lat.toFixed(2));
  });
});

describe('what people did', () => {
  it('counts past sits with what was bumped, visits, and booked sits before the window; nothing cancelled or forgotten', async () => {
    const past = await book(bert, west, { day: '2026-11-05', windows: 'evening' });
    const dropped = await book(bert, east, { day: '2026-11-06' });
    await cancelSit(bert.scope, { sitId: dropped.id, reason: '' }, TEST_NOW);
    const seen = { antleredBucks: 1, does: 2, fawns: 0, unknown: 1, bumpedIn: 1, bumpedSitting: 0, bumpedOut: 2 };
    const hours = { startAt: past.startAt, endAt: past.startAt + 3 * HOUR, createdAt: TEST_NOW };
    const visit = {
      clubId: club.id,
      kind: 'camera_check' as const,
      ...near(0.001),
      memberId: ann.id,
      createdAt: TEST_NOW,
    };
    await write(async (tx) => {
      await tx.insert(sitLogs).values({ sitId: past.id, clubId: club.id, ...seen, ...hours });
      await tx.insert(visits).values({ ...visit, id: newId('visit'), at: TEST_NOW - DAY });
      await tx.insert(visits).values({ ...visit, id: newId('visit'), at: TEST_NOW - 30 * DAY });
      await tx.insert(visits).values({ ...visit, id: newId('visit'), at: TEST_NOW - DAY, removedAt: TEST_NOW });
    });
    const events = await loadEvents(ann.scope, Date.UTC(2026, 10, 7, 11), TEST_NOW);
    expect(events.map(({ kind, standId, bumped }) => [kind, standId, bumped])).toEqual([
      ['sit', west, 3],
      ['camera_check', null, 0],
    ]);
    expect(await loadSightings(ann.scope, SATURDAY, TEST_NOW)).toEqual([]);
    expect(await loadSightings(ann.scope, SATURDAY, past.endAt)).toEqual([
      { standId: west, sits: 1, hours: 3, deer: 4 },
    ]);
  });

  it('makes a pressed stand score less', async () => {
    const fresh = (await list(ann)).open.find(({ name }) => name === 'West Oak');
    const visit = { clubId: club.id, kind: 'work' as const, ...near(0.002), memberId: ann.id, createdAt: TEST_NOW };
    await write((tx) => tx.insert(visits).values({ ...visit, id: newId('visit'), at: TEST_NOW - HOUR, bumped: 2 }));
    const pressed = (await list(ann)).open.find(({ name }) => name === 'West Oak');
    expect(pressed?.score).toBeLessThan(fresh?.score ?? 0);
  });
});

describe('the week', () => {
  it('says of each window what its list says', async () => {
    await book(bert, west);
    const kept = steady(270);
    const week = await readWeek(ann.scope, {}, TEST_NOW, { forecast: kept });
    expect(week.columns).toHaveLength(16);
    for (const column of week.columns.slice(0, 8)) {
      const { day, window } = column.window;
      const one = await list(ann, { day, window }, kept);
      expect(column.order).toEqual([...one.open, ...one.blocked].map((row) => row.standId));
      for (const row of one.open) {
        const cell = column.cells.find(({ standId }) => standId === row.standId);
        expect(cell).toMatchObject({ open: true, score: row.score, word: row.word, hold: row.hold });
      }
    }
    const taken = week.columns.find(({ window }) => window.day === SATURDAY && window.window === 'morning');
    expect(taken?.cells.find(({ standId }) => standId === west)).toMatchObject({ open: false });
  });

  it('shows a week of windows without a forecast', async () => {
    const week = await readWeek(ann.scope, {}, TEST_NOW, {
      forecast: { forecast: null, ageMs: null, stale: false, error: null },
    });
    expect(week.columns).toHaveLength(14);
    expect(week.strips).toEqual([]);
  });
});

describe('the routes', () => {
  const ask = (who: TestMember, get: typeof getSits, query = '', stand = '') =>
    inRequest(who.browser, () =>
      get(new Request(`http://127.0.0.1/api/x?${query}`), { params: Promise.resolve({ club: club.slug, stand }) }),
    );

  it('answer a member, and refuse what cannot be read with plain words', async () => {
    expect((await ask(ann, getSits, `day=${SATURDAY}&window=morning`)).status).toBe(200);
    expect((await ask(ann, getDetail, `day=${SATURDAY}&window=morning`, west)).status).toBe(200);
    expect((await ask(ann, getWeek)).status).toBe(200);
    for (const query of ['day=2026-02-30', 'day=9999-12-31', 'window=noon', 'weapon=spear']) {
      expect((await ask(ann, getSits, query)).status).toBe(400);
    }
    expect((await ask(ann, getDetail, '', 'std_none')).status).toBe(404);
  });

  it('give a stranger the answer of a missing club', async () => {
    const stranger = await addMember(await makeClub());
    for (const get of [getSits, getDetail, getWeek]) expect((await ask(stranger, get, '', west)).status).toBe(404);
    const landowner = await addMember(club, 'landowner');
    expect((await ask(landowner, getSits)).status).toBe(403);
  });
});
