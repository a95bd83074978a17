import { describe, expect, it } from 'vitest';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { readWeek } from '@/features/sits/read-week';
import { readSitDetail, readSits } from '@/features/sits/reads';
import { ensureForecast } from '@/features/weather/ensure-forecast';
import { book, refusal } from '../helpers/book';
import { addMember, addStand, makeClub, TEST_NOW, TEST_PLACE } from '../helpers/make-club';
import { eachSitsClub, listFor, MORNING, near, steady } from '../helpers/sits-club';

const made = eachSitsClub();

describe('the ranked list', () => {
  it('puts the stand with the right wind first, and turns with the wind', async () => {
    const { ann } = made;
    const inWest = await listFor(ann);
    expect(inWest.open.map(({ rank, name }) => [rank, name])).toEqual([
      [1, 'West Oak'],
      [2, 'East Oak'],
    ]);
    expect(inWest.open[0]?.sentence).toMatch(/^W holds \d+ %; walk in by Creek way, in by \d/);
    expect(inWest.open[1]?.sentence).toMatch(/^W is the wrong wind/);
    expect(inWest.open[0]?.shares).toHaveLength(72);
    const inEast = await listFor(ann, MORNING, steady(90));
    expect(inEast.open.map(({ name }) => name)).toEqual(['East Oak', 'West Oak']);
  });

  it('is the next window that is worth walking in for, unless asked otherwise', async () => {
    const { ann } = made;
    // TEST_NOW is 10:00 at the club, an hour before the morning ends.
    expect((await listFor(ann, {})).window).toMatchObject({ day: '2026-11-04', window: 'evening' });
    expect((await listFor(ann, { day: '2026-11-09' })).window).toMatchObject({ day: '2026-11-09', window: 'morning' });
  });

  it('names the rule, its holder and its end for what is not open', async () => {
    const { ann, bert, west } = made;
    await book(bert, west);
    const { open, blocked } = await listFor(ann);
    expect(open.map(({ name }) => name)).toEqual(['East Oak']);
    expect(blocked[0]).toMatchObject({ name: 'West Oak', gates: [{ code: 'taken' }] });
    expect(blocked[0]?.gates[0]?.text).toContain('Bert Hale');
    const monday = await listFor(ann, { day: '2026-11-09', window: 'morning' });
    expect(monday.blocked[0]?.gates[0]).toMatchObject({ code: 'resting', ends: 'Open again Wed 11 Nov' });
  });

  it('shows one’s own sit and where it could be moved, and opens again when it is cancelled', async () => {
    const { ann, west } = made;
    const sit = await book(ann, west, { windows: 'all_day' });
    const mine = await listFor(ann);
    expect(mine.mine).toMatchObject({ sitId: sit.id, standName: 'West Oak', windows: 'all_day', sequence: 0 });
    expect(mine.open.map(({ name, mine: own }) => [name, own])).toEqual([
      ['West Oak', true],
      ['East Oak', false],
    ]);
    await cancelSit(ann.scope, { sitId: sit.id, reason: '' }, TEST_NOW);
    expect((await listFor(ann)).mine).toBeNull();
  });

  it('says which stands are not for a weapon', async () => {
    const { club, ann } = made;
    await addStand(club, { name: 'Bow Nook', ...near(0.01), shotRangeM: { bow: 25 } });
    const { blocked, weapons } = await listFor(ann, { ...MORNING, weapon: 'rifle' });
    expect(weapons).toEqual(['bow', 'rifle']);
    expect(blocked.map(({ name, gates }) => [name, gates[0]?.code])).toEqual([['Bow Nook', 'weapon']]);
  });

  it('states the legal light as the club’s rule', async () => {
    const { ann } = made;
    const rule = {
      name: 'Deer',
      minutesBeforeSunrise: 30,
      minutesAfterSunset: 30,
      source: 'Hunting digest',
      statedOn: '2026-08-01',
    };
    const strict = await makeClub({ legalLight: [rule] });
    const member = await addMember(strict);
    const { light, sky } = await listFor(member);
    expect(light?.text).toContain('Club rule: 30 min before sunrise to 30 min after sunset (Hunting digest');
    expect(Math.abs((sky.rise ?? 0) - 30 * 60_000 - (light?.startAt ?? 0))).toBeLessThan(60_000);
    expect((await listFor(ann)).light).toBeNull();
  });

  it('has nothing to rank in a club without stands', async () => {
    const empty = await addMember(await makeClub());
    expect(await listFor(empty)).toMatchObject({ standCount: 0, open: [], blocked: [], mine: null });
  });
});

describe('the forecast', () => {
  it('may be missing: the list stands on arcs, rest and the way in', async () => {
    const { ann } = made;
    const none = await listFor(ann, MORNING, {
      forecast: null,
      ageMs: null,
      stale: false,
      error: 'The service is down.',
    });
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
    const { ann } = made;
    expect((await listFor(ann, MORNING, { ...steady(270), stale: true })).forecast.state).toBe('stale');
    const later = await listFor(ann, { day: '2026-12-20', window: 'evening' });
    expect(later.forecast.state).toBe('beyond');
    expect(later.open[0]?.confidence ?? later.blocked[0]?.confidence).toBe('none');
  });

  it('lowers certainty when the wind is variable', async () => {
    const { ann } = made;
    const settled = await listFor(ann);
    const variable = await listFor(ann, MORNING, steady(270, { windFromDeg: null, windSpeedMps: 1.5 }));
    expect(settled.open[0]?.confidence).not.toBe('low');
    expect(variable.open[0]?.confidence).toBe('low');
  });

  it('is fetched from the weather that is set, and kept for the next reader', async () => {
    const { ann } = made;
    await ensureForecast(TEST_PLACE, TEST_NOW, { waitMs: 60_000 });
    const view = await readSits(ann.scope, { day: '2026-11-05', window: 'morning' }, TEST_NOW);
    expect(view.forecast).toMatchObject({ state: 'fresh', source: 'Made weather (no real forecast)' });
    expect(view.weather?.wind).toMatch(/mph/);
  });

  it('warns once of thunder over the whole ground', async () => {
    const { ann } = made;
    const view = await listFor(ann, MORNING, steady(270, { thunder: true }));
    expect(view.cautions.map(({ code, level }) => [code, level])).toEqual([['thunder', 'stop']]);
    expect(view.open.flatMap((row) => row.cautions).filter(({ code }) => code === 'thunder')).toEqual([]);
  });
});

describe('an opened row', () => {
  it('has half hours, reasons, ways and what would change it, scored as in the list', async () => {
    const { ann, west } = made;
    const row = (await listFor(ann)).open[0];
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
    const { ann } = made;
    const other = await addStand(await makeClub());
    expect((await refusal(readSitDetail(ann.scope, other, MORNING, TEST_NOW, { forecast: steady(0) }))).code).toBe(
      'not_found',
    );
  });
});

describe('a guest', () => {
  it('gets the same ranking without names of features and without positions', async () => {
    const { club, ann, west } = made;
    const guest = await addMember(club, 'guest', { sponsorId: ann.id, guestFrom: '2026-11-01', guestTo: '2026-11-30' });
    const kept = steady(270);
    const [own, full] = [await listFor(guest), await listFor(ann)];
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
