import { beforeAll, beforeEach } from 'vitest';
import type { Forecast, WeatherHour } from '@/core/condition-types';
import { readSits, type SitsAsk } from '@/features/sits/reads';
import type { KeptForecast } from '@/features/weather/get-forecast';
import { setClock } from '@/server/clock';
import { addApproach, addFeature } from './add-ground';
import { SATURDAY } from './book';
import { addMember, addStand, makeClub, TEST_NOW, TEST_PLACE, type TestClub, type TestMember } from './make-club';

export const HOUR = 3_600_000;
export const DAY = 24 * HOUR;
export const MORNING: SitsAsk = { day: SATURDAY, window: 'morning' };

/** A steady wind for ten days. */
export function steady(fromDeg: number, over: Partial<WeatherHour> = {}): KeptForecast {
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

export const near = (north: number, east = 0) => ({ lat: TEST_PLACE.lat + north, lon: TEST_PLACE.lon + east });

export interface SitsClub {
  club: TestClub;
  ann: TestMember;
  bert: TestMember;
  /** West Oak, good in west winds; its bedding area is Hidden Hollow. */
  west: string;
  /** East Oak, good in east winds. */
  east: string;
}

/** A new club for each test of a file, filled into one object. */
export function eachSitsClub(): SitsClub {
  const made = {} as SitsClub;
  beforeAll(() => setClock(() => TEST_NOW));
  beforeEach(async () => {
    const club = await makeClub();
    const west = [{ fromDeg: 225, toDeg: 315, window: null }];
    const east = [{ fromDeg: 45, toDeg: 135, window: null }];
    Object.assign(made, {
      club,
      ann: await addMember(club, 'member', { name: 'Ann Roe' }),
      bert: await addMember(club, 'member', { name: 'Bert Hale' }),
      west: await addStand(club, { name: 'West Oak', ...near(0.002), arcs: west }),
      east: await addStand(club, { name: 'East Oak', ...near(0.006, -0.004), arcs: east }),
    });
    await addApproach(club, made.west, near(0.002), 'Creek way');
    await addApproach(club, made.east, near(0.006, -0.004), 'Ridge way');
    await addFeature(club, 'Hidden Hollow', 'bedding', near(0.002, 0.003));
  });
  return made;
}

export function listFor(who: TestMember, ask: SitsAsk = MORNING, kept = steady(270)) {
  return readSits(who.scope, ask, TEST_NOW, { forecast: kept });
}
