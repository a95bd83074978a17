import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { chooseWeather } from '@/adapters/weather/choose';
import { WINDOW_NAMES } from '@/core/condition-types';
import { addDays } from '@/core/day-time';
import { sitWindow } from '@/core/windows';
import { reader } from '@/db/client';
import { forecastFrom } from '@/features/sits/load-forecast';
import { readHindcast } from '@/features/sits/read-hindcast';
import { readSitDetail, readSits } from '@/features/sits/reads';
import type { SitsView } from '@/features/sits/view-types';
import { type ClubScope, systemScopeBySlug } from '@/server/scope';
import { addApproach, addFeature } from '../helpers/add-ground';
import { addStand, makeClub, TEST_PLACE } from '../helpers/make-club';

const root = resolve(import.meta.dirname, '../..');
const FILE = resolve(root, process.env.REAL_HOURS ?? '../shared/data/hourly-observations-KEWR-2013-autumn.csv');
const DAYS = Array.from({ length: 20 }, (_, i) => addDays('2013-10-05', i * 4));
const LEAD_MS = 12 * 3_600_000;

const folder = mkdtempSync(join(tmpdir(), 'windrest-hours-'));
const databaseUrl = `file:${join(folder, 'copy.db')}`;
let scope: ClubScope;

beforeAll(async () => {
  const club = await makeClub();
  for (let i = 0; i < 8; i++) {
    const at = { lat: TEST_PLACE.lat + (i % 4) * 0.003, lon: TEST_PLACE.lon + Math.floor(i / 4) * 0.004 };
    const arcs = [{ fromDeg: (i * 45) % 360, toDeg: (i * 45 + 110) % 360, window: null }];
    const drain = i % 2 === 0 ? { drainBearingDeg: (i * 80) % 360, slopePercent: 12 } : {};
    const id = await addStand(club, { name: `Stand ${i + 1}`, ...at, arcs, facingDeg: (i * 60) % 360, ...drain });
    await addApproach(club, id, at, `Way ${i + 1}`);
  }
  await addFeature(club, 'Cedar thicket', 'bedding', { lat: TEST_PLACE.lat + 0.005, lon: TEST_PLACE.lon + 0.002 });
  await addFeature(club, 'Clover strip', 'food_plot', { lat: TEST_PLACE.lat + 0.001, lon: TEST_PLACE.lon + 0.005 });
  scope = await systemScopeBySlug(club.slug);
  await reader().run(sql`vacuum into ${join(folder, 'copy.db')}`);
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

function replay(day: string, window: 'morning' | 'evening', lead = LEAD_MS) {
  const now = sitWindow(day, window, scope.club.rules, scope.club).startAt - lead;
  return { now, port: chooseWeather({ weather: `replay:${FILE}` }, { issuedAt: () => now }) };
}

async function rankOn(day: string, window: 'morning' | 'evening'): Promise<SitsView> {
  const { now, port } = replay(day, window);
  return readSits(scope, { day, window }, now, { forecast: await forecastFrom(port, scope), rules: 'leave_out' });
}

/** JSON has no NaN: it would arrive as null. */
function figures(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  if (Array.isArray(value)) return value.flatMap(figures);
  return value !== null && typeof value === 'object' ? Object.values(value).flatMap(figures) : [];
}

function runScript(script: string, args: string[]) {
  const tsx = join(root, 'node_modules/tsx/dist/cli.mjs');
  return spawnSync(process.execPath, [tsx, '--conditions=react-server', `scripts/${script}.ts`, ...args], {
    cwd: root,
    env: { ...process.env, DATABASE_URL: databaseUrl },
    encoding: 'utf8',
  });
}

// Federal hourly observations of a New Jersey airport, autumn 2013; the file is no part of this project.
describe.skipIf(!existsSync(FILE))('the list on real hours', () => {
  it('ranks every stand on 20 autumn days, with reasons and without a figure that is none', async () => {
    for (const day of DAYS) {
      for (const window of WINDOW_NAMES) {
        const view = await rankOn(day, window);
        expect(view.open.map((row) => row.rank)).toEqual([1, 2, 3, 4, 5, 6, 7, 8]);
        const scores = view.open.map((row) => row.score);
        expect(scores).toEqual([...scores].sort((a, b) => b - a));
        expect(Math.min(...scores)).toBeGreaterThanOrEqual(0);
        expect(Math.max(...scores)).toBeLessThanOrEqual(100);
        expect(figures(view).every(Number.isFinite)).toBe(true);
      }
    }
  });

  it('gives each stand reasons that name what it stands on', async () => {
    const { now, port } = replay('2013-11-09', 'morning');
    const forecast = await forecastFrom(port, scope);
    const ask = { day: '2013-11-09', window: 'morning' as const };
    const view = await readSits(scope, ask, now, { forecast, rules: 'leave_out' });
    for (const row of view.open) {
      const detail = await readSitDetail(scope, row.standId, ask, now, { forecast, rules: 'leave_out' });
      expect(figures(detail).every(Number.isFinite)).toBe(true);
      expect(detail.reasons.length).toBeGreaterThan(0);
      expect(detail.score).toBe(row.score);
    }
  });

  it('is less sure in variable and calm hours than in steady wind', async () => {
    const port = replay('2013-10-05', 'morning').port;
    const hours = (await forecastFrom(port, scope)).forecast?.hours ?? [];
    const levels: Record<'settled' | 'unsettled', string[]> = { settled: [], unsettled: [] };
    for (let i = 0; i < 110; i++) {
      const day = addDays('2013-09-05', i);
      const span = sitWindow(day, 'morning', scope.club.rules, scope.club);
      const inside = hours.filter((hour) => hour.at >= span.startAt && hour.at <= span.endAt);
      if (inside.length < 4) continue;
      const weak = inside.filter((hour) => hour.windFromDeg === null || (hour.windSpeedMps ?? 0) < 2).length;
      const strong = inside.filter((hour) => hour.windFromDeg !== null && (hour.windSpeedMps ?? 0) > 5).length;
      const kind = weak > inside.length * 0.7 ? 'unsettled' : strong === inside.length ? 'settled' : null;
      if (kind) levels[kind].push((await rankOn(day, 'morning')).open[0]?.confidence ?? 'gone');
    }
    expect(levels.unsettled.length).toBeGreaterThan(3);
    expect(levels.settled.length).toBeGreaterThan(3);
    expect(new Set(levels.unsettled)).toEqual(new Set(['low']));
    expect(levels.settled).not.toContain('low');
  });

  it('is the same list on the command line', async () => {
    const { slug } = scope.club;
    const args = ['--club', slug, '--day', '2013-11-09', '--window', 'morning', '--weather', `replay:${FILE}`];
    const told = runScript('sits', [...args, '--json']);
    expect(told.stderr).toBe('');
    const view: SitsView = JSON.parse(told.stdout);
    const own = await rankOn('2013-11-09', 'morning');
    expect(view.open.map(({ name, score }) => [name, score])).toEqual(own.open.map(({ name, score }) => [name, score]));
    expect(runScript('sits', args).stdout).toContain(`1  ${own.open[0]?.name}`);
  });

  it('looks back on the season: each stand within its windows, and the winds that blew add up', async () => {
    const view = await readHindcast(scope, 0, replay('2013-10-05', 'morning').port);
    expect(view).toMatchObject({ fromDay: '2013-09-01', toDay: '2013-12-30' });
    expect(view.hindcast.windows).toBe(242);
    expect(view.hindcast.sectors.reduce((sum, sector) => sum + sector.share, 0)).toBeCloseTo(1, 9);
    expect(view.hindcast.stands.every(({ share }) => share !== null && share >= 0 && share <= 1)).toBe(true);
    const told = runScript('hindcast', ['--club', scope.club.slug, '--weather', `replay:${FILE}`, '--json']);
    expect(JSON.parse(told.stdout)).toEqual(JSON.parse(JSON.stringify(view)));
  });
});

describe('the command line', () => {
  it('lists clubs, and says plainly what it cannot do', () => {
    expect(runScript('sits', ['--list-clubs']).stdout).toContain(scope.club.slug);
    const wrong = [
      { args: [], says: /--list-clubs/ },
      { args: ['--club', 'nowhere'], says: /nothing here/ },
      { args: ['--club', scope.club.slug, '--day', 'soon'], says: /write YYYY-MM-DD/ },
      { args: ['--club', scope.club.slug, '--window', 'noon'], says: /write morning or evening/ },
      { args: ['--club', scope.club.slug, '--weather', 'guess'], says: /write fake, hosted or replay:FILE/ },
    ];
    for (const { args, says } of wrong) {
      const told = runScript('sits', args);
      expect(told.status).toBe(1);
      expect(told.stderr).toMatch(says);
      expect(told.stderr).not.toMatch(/\n\s+at /);
    }
  });
});
