import { existsSync, readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseReplayCsv } from '../../adapters/weather/replay-csv';
import { DEFAULT_CLUB_RULES } from '../booking/rules';
import type { SitWindow, WeatherHour, WindowName } from '../condition-types';
import { addDays } from '../day-time';
import type { GoodWindArc, Suitability } from '../ground-types';
import { allDayWindows } from '../windows';
import { type CoveringStand, coveredShare, coverWinds, windShares } from './cover-winds';
import { tryStand } from './try-stand';

const PLACE = { lat: 40.7, lon: -74.2, zone: 'America/New_York' };
const HOUR = 3_600_000;
const stand = (
  id: string,
  arcs: GoodWindArc[],
  over: Partial<Record<WindowName, Suitability>> = {},
): CoveringStand => ({
  id,
  name: id,
  arcs,
  suitability: { morning: 'usable', evening: 'usable', ...over },
});
const both = (fromDeg: number, toDeg: number): GoodWindArc => ({ fromDeg, toDeg, window: null });

const blank = { gustMps: null, tempC: null, pressureHpa: null, precipMm: null, cloudPercent: null, radiationWm2: null };
const hour = (at: number, windFromDeg: number | null, windSpeedMps: number | null = 3): WeatherHour => ({
  ...blank,
  at,
  windFromDeg,
  windSpeedMps,
  thunder: false,
});

const MORNING: SitWindow = { day: '2024-11-09', window: 'morning', startAt: 10 * HOUR, endAt: 14 * HOUR };

describe('winds that stands cover', () => {
  const west = stand('West', [both(250, 290)]);
  const wide = stand('Wide', [both(270, 20)]);

  it('counts a small morning as by hand', () => {
    const hours = [9, 10, 11, 12, 13, 14].map((h, i) => hour(h * HOUR, [270, 260, 280, 90, null, 270][i] ?? null));
    const { cells, stands } = coverWinds({ stands: [west, wide], hours, windows: [MORNING] });
    // 9:00 is before the window and 14:00 its end. 260: West alone. 280: both. 90: none. The last is variable.
    expect(cells.map((c) => [c.window, c.month, c.hours, c.noDirection])).toEqual([
      ['morning', 11, 4, 1],
      ['morning', null, 4, 1],
    ]);
    expect(stands.map((s) => [s.name, s.hours.morning, s.alone])).toEqual([
      ['West', 2, 1],
      ['Wide', 1, 0],
    ]);
    expect(cells[0] && coveredShare(cells[0])).toBe(2 / 3);
    expect(cells[0]?.blew[4]).toBe(1);
    expect(windShares(cells[0])[12]).toBeCloseTo(2 / 3, 12);
  });

  it('gives the gain of a trial beside what stands cover already', () => {
    const hours = [10, 11, 12].map((h, i) => hour(h * HOUR, [270, 90, 100][i] ?? null));
    const trial = stand('Trial', [both(80, 95), both(260, 280)]);
    const { winds } = coverWinds({ stands: [west], hours, windows: [MORNING] });
    const [gain, ...more] = tryStand(winds, trial);
    expect(more).toEqual([]);
    // 270 is West's already; 90 is nobody's; 100 lies outside both arcs.
    expect(gain).toMatchObject({ window: 'morning', hours: 2, alone: 1, covered: 1 / 3, added: 1 / 3 });
    expect(gain?.months).toEqual([{ month: 11, added: 1 / 3 }]);
    expect(gain?.points[4]).toMatchObject({ share: 2 / 3, covered: 0, added: 1 / 3 });
    const avoided = { ...trial, suitability: { morning: 'avoid', evening: 'usable' } as const };
    expect(tryStand(winds, avoided)[0]).toMatchObject({ hours: 0, added: 0 });
  });

  it('counts nothing for a stand avoided then, nor for a calm', () => {
    const avoided = stand('Avoided', [both(0, 360)], { morning: 'avoid' });
    const hours = [hour(10 * HOUR, 270), hour(11 * HOUR, 270, 0), hour(12 * HOUR, 270, null)];
    const { cells, stands } = coverWinds({ stands: [avoided], hours, windows: [MORNING] });
    expect(stands[0]?.hours.morning).toBe(0);
    expect([cells[1]?.hours, cells[1]?.noDirection]).toEqual([2, 1]);
    expect(coverWinds({ stands: [], hours: [], windows: [MORNING] }).cells.map(coveredShare)).toEqual([null, null]);
  });

  it('never covers less with a wider arc or one more stand, and never more than blew', () => {
    const arc = fc.record({ from: fc.integer({ min: 0, max: 359 }), width: fc.integer({ min: 0, max: 200 }) });
    const winds = fc.array(fc.integer({ min: 0, max: 359 }), { minLength: 4, maxLength: 4 });
    fc.assert(
      fc.property(winds, arc, arc, fc.integer({ min: 0, max: 100 }), (dirs, a, b, more) => {
        const hours = dirs.map((deg, i) => hour((10 + i) * HOUR, deg));
        const share = (stands: CoveringStand[]) => {
          const [, season] = coverWinds({ stands, hours, windows: [MORNING] }).cells;
          return season ? (coveredShare(season) ?? 0) : 0;
        };
        const one = stand('a', [both(a.from, a.from + a.width)]);
        const wider = stand('a', [both(a.from, a.from + a.width + more)]);
        const two = stand('b', [both(b.from, b.from + b.width)]);
        expect(share([wider])).toBeGreaterThanOrEqual(share([one]));
        expect(share([one, two])).toBeGreaterThanOrEqual(share([one]));
        expect(share([one, two])).toBeLessThanOrEqual(1);
        // Hung, a trial covers what was said it would.
        const { winds: counted } = coverWinds({ stands: [one], hours, windows: [MORNING] });
        const [gain] = tryStand(counted, two);
        expect(share([one]) + (gain?.added ?? 0)).toBeCloseTo(share([one, two]), 12);
      }),
    );
  });
});

const file = process.env.REAL_HOURS ?? '../shared/data/hourly-observations-KEWR-2013-autumn.csv';

describe.skipIf(!existsSync(file))('a real autumn of hourly observations', () => {
  it('equals a direct count over the lines of the file', () => {
    const text = readFileSync(file, 'utf8');
    const { hours } = parseReplayCsv(text);
    const days = Array.from({ length: 60 }, (_, i) => addDays('2013-10-01', i));
    const windows = days.flatMap((day) => allDayWindows(day, DEFAULT_CLUB_RULES, PLACE));
    const stands = [stand('NW', [both(290, 340)]), stand('S', [{ fromDeg: 150, toDeg: 215, window: 'evening' }])];
    const { cells, stands: rows } = coverWinds({ stands, hours, windows });

    // Counted again from the text alone, with plain comparisons.
    const [heading, ...lines] = text.trim().split(/\r?\n/);
    const columns = (heading ?? '').split(',');
    const column = (line: string, name: string) => line.split(',')[columns.indexOf(name)] ?? '';
    const count = { morning: 0, evening: 0, nw: 0, s: 0, either: 0, directed: 0, november: 0 };
    for (const line of lines) {
      const at = Date.parse(column(line, 'time_utc'));
      const window = windows.find((w) => at >= w.startAt && at < w.endAt);
      const speed = column(line, 'wind_speed_mph');
      if (!window || speed === '') continue;
      count[window.window]++;
      const deg = column(line, 'wind_from_deg');
      if (deg === '' || Number(speed) === 0) continue;
      count.directed++;
      if (window.day.startsWith('2013-11') && window.window === 'morning') count.november++;
      const from = Number(deg) % 360;
      const nw = from >= 290 && from <= 340;
      const s = window.window === 'evening' && from >= 150 && from <= 215;
      if (nw) count.nw++;
      if (s) count.s++;
      if (nw || s) count.either++;
    }
    const season = cells.filter((cell) => cell.month === null);
    const total = (list: number[]) => list.reduce((a, b) => a + b, 0);
    expect(count.directed).toBeGreaterThan(300);
    expect(season.map((cell) => cell.hours)).toEqual([count.morning, count.evening]);
    expect(rows.map((row) => row.hours.morning + row.hours.evening)).toEqual([count.nw, count.s]);
    expect(total(season.map((cell) => total(cell.covered)))).toBe(count.either);
    expect(total(season.map((cell) => total(cell.blew)))).toBe(count.directed);
    const november = cells.find((cell) => cell.month === 11 && cell.window === 'morning');
    expect(total(november?.blew ?? [])).toBe(count.november);
  });
});
