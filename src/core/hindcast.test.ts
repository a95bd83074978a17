import { existsSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { makeForecast, makeStand, PLACE, windowOf } from '../../tests/helpers/small-ground';
import { parseReplayCsv } from '../adapters/weather/replay-csv';
import { DEFAULT_CLUB_RULES } from './booking/rules';
import type { WindowName } from './condition-types';
import { addDays } from './day-time';
import { formatHindcast } from './format-hindcast';
import { hindcast } from './hindcast';
import { DEFAULT_SETTINGS } from './settings';
import { allDayWindows } from './windows';

const settings = DEFAULT_SETTINGS;
const both = (fromDeg: number, toDeg: number) => [{ fromDeg, toDeg, window: null }];
const stands = [
  makeStand({ id: 'west', arcs: both(225, 315) }),
  makeStand({ id: 'east', arcs: both(45, 135) }),
  makeStand({ id: 'evening', arcs: [{ fromDeg: 225, toDeg: 315, window: 'evening' }] }),
  makeStand({ id: 'avoid', arcs: both(225, 315), suitability: { morning: 'avoid', evening: 'usable' } }),
];

describe('a season replayed over stands', () => {
  const day = ['2023-12-09', '2023-12-10'];
  const names: WindowName[] = ['morning', 'evening'];
  const windows = day.flatMap((d) => names.map((w) => windowOf(w, d)));
  const [first, second, third, fourth] = windows;
  if (!first || !second || !third || !fourth) throw new Error('four windows are needed');
  const hoursOf = (w: (typeof windows)[number], deg: number) =>
    makeForecast(w, deg, 5).hours.filter((h) => h.at > w.startAt - 2 * 3_600_000 && h.at < w.endAt + 2 * 3_600_000);
  const hours = [...hoursOf(first, 270), ...hoursOf(second, 270), ...hoursOf(third, 180), ...hoursOf(fourth, 90)];
  const result = hindcast({ place: PLACE, stands, hours, windows, settings });
  const row = (id: string) => result.stands.find((s) => s.standId === id);

  it('counts the windows each could have been sat on, by arc, window and the steward’s rating', () => {
    expect(row('west')?.sittable).toEqual({ morning: 1, evening: 1 });
    expect(row('east')?.sittable).toEqual({ morning: 0, evening: 1 });
    expect(row('evening')?.sittable).toEqual({ morning: 0, evening: 1 });
    expect(row('avoid')?.sittable).toEqual({ morning: 0, evening: 1 });
    expect(row('west')?.share).toBe(0.5);
    expect(row('west')?.coveredShare).toBe(0.25);
  });

  it('names the winds no stand covers and the windows no stand could take', () => {
    expect(result.uncovered.map((s) => s.sector)).toEqual(['S']);
    expect(result.noStand).toEqual([{ day: '2023-12-10', window: 'morning' }]);
    expect(result.sectors.reduce((sum, s) => sum + s.share, 0)).toBeCloseTo(1, 12);
  });

  it('does not judge a window with no records, and holds calm hours in no arc', () => {
    const gap = hindcast({ place: PLACE, stands, hours: hoursOf(first, 270), windows, settings });
    expect(gap.judged).toBe(1);
    const calm = hoursOf(first, 270).map((h) => ({ ...h, windSpeedMps: 0 }));
    const still = hindcast({ place: PLACE, stands, hours: calm, windows: [first], settings });
    expect(still.stands.every((s) => s.sittable.morning === 0)).toBe(true);
    expect(still.noDirectionShare).toBe(1);
  });

  it('writes it as text', () => {
    const text = formatHindcast(result);
    expect(text).toContain('No stand covers: S');
    expect(text).toMatch(/west +1\/2 +1\/2 +50 % +25 %/);
  });
});

const file = process.env.REAL_HOURS ?? '../shared/data/hourly-observations-KEWR-2013-autumn.csv';

describe.skipIf(!existsSync(file))('a real autumn of hourly observations', () => {
  it('gives every stand a share that grows with its arcs', () => {
    const { hours } = parseReplayCsv(readFileSync(file, 'utf8'));
    const place = { lat: 40.7, lon: -74.2, zone: 'America/New_York' };
    const days = Array.from({ length: 60 }, (_, i) => addDays('2013-10-01', i));
    const windows = days.flatMap((d) => allDayWindows(d, DEFAULT_CLUB_RULES, place));
    const widths = [30, 60, 90, 180, 360].map((w) => makeStand({ id: `w${w}`, arcs: both(270 - w / 2, 270 + w / 2) }));
    const result = hindcast({ place, stands: widths, hours, windows, settings });
    expect(result.judged).toBeGreaterThan(100);
    const shares = result.stands.map((s) => s.share ?? -1);
    for (let i = 1; i < shares.length; i++) expect(shares[i]).toBeGreaterThanOrEqual(shares[i - 1] ?? 1);
    expect(shares[4]).toBeGreaterThan(0.5);
    expect(result.uncovered).toEqual([]);
  });
});
