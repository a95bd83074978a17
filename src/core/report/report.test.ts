import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { firstRestedDay } from '../booking/rest';
import { PRESSURE_KINDS, type PressureEvent } from '../condition-types';
import { addDays } from '../day-time';
import { gini } from '../draw/fairness';
import { DEFAULT_PRESSURE, nearEvents, pressureLeft } from '../pressure';
import { bumpsByWind, countBumps, windOf } from './bumps';
import { giniByLot, sharedAs } from './by-lot';
import { goodSits, type JudgedSit, LEAST_SCORES } from './good-sits';
import { pressureSeries } from './pressure-series';
import { restsOf } from './rests';
import { shareOut } from './sharing';
import { unusedOf, useOfStand } from './stand-use';
import { weeksBetween } from './weeks';

const DAY_MS = 86_400_000;

describe('weeks', () => {
  it('run from Monday to Sunday and hold both ends', () => {
    // 7 November 2026 is a Saturday.
    expect(weeksBetween('2026-11-07', '2026-11-09')).toEqual([
      { fromDay: '2026-11-02', toDay: '2026-11-08' },
      { fromDay: '2026-11-09', toDay: '2026-11-15' },
    ]);
    expect(weeksBetween('1969-12-31', '1969-12-31')).toEqual([{ fromDay: '1969-12-29', toDay: '1970-01-04' }]);
    expect(weeksBetween('2026-11-09', '2026-11-08')).toEqual([]);
  });
});

describe('how a stand was used', () => {
  const both = ['morning', 'evening'] as const;
  const sits = [
    { standId: 'a', day: '2026-11-10', windows: ['evening'] as const },
    { standId: 'a', day: '2026-11-07', windows: ['morning'] as const },
    { standId: 'a', day: '2026-11-07', windows: both },
  ];

  it('counts an all-day sit once and in both windows', () => {
    expect(useOfStand(sits, weeksBetween('2026-11-07', '2026-11-10'))).toEqual({
      sits: 3,
      mornings: 2,
      evenings: 2,
      days: ['2026-11-07', '2026-11-10'],
      byWeek: [2, 1],
    });
  });

  it('misses a window only where the steward thinks it of use', () => {
    const fit = { morning: 'prime', evening: 'usable' } as const;
    const mornings = { sits: 2, mornings: 2, evenings: 0 };
    expect(unusedOf({ sits: 0, mornings: 0, evenings: 0 }, fit)).toBe('never');
    expect(unusedOf(mornings, fit)).toBe('mornings_only');
    expect(unusedOf(mornings, { ...fit, evening: 'avoid' })).toBeNull();
    expect(unusedOf({ sits: 1, mornings: 0, evenings: 1 }, fit)).toBe('evenings_only');
    expect(unusedOf({ sits: 2, mornings: 1, evenings: 1 }, fit)).toBeNull();
  });
});

describe('rests', () => {
  it('are counted in full days: sat on the 7th with 3 days of rest, ready on the 11th (club practice)', () => {
    const sat = (second: string) => restsOf({ restDays: 3, sitDays: ['2026-11-07', second], before: null });
    expect(sat('2026-11-11')).toEqual({ times: 1, kept: 1, least: 3, broken: [] });
    expect(sat('2026-11-10')).toEqual({
      times: 1,
      kept: 0,
      least: 2,
      broken: [{ day: '2026-11-10', after: '2026-11-07', rested: 2 }],
    });
    expect(sat('2026-11-07')).toEqual({ times: 0, kept: 0, least: null, broken: [] });
    const reached = restsOf({ restDays: 3, sitDays: ['2026-11-07'], before: '2026-11-05' });
    expect(reached.broken).toEqual([{ day: '2026-11-07', after: '2026-11-05', rested: 1 }]);
  });

  it('are all kept where each day sat is the first that the booking rule allows', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 7 }),
        fc.array(fc.integer({ min: 0, max: 9 }), { maxLength: 12 }),
        (restDays, waits) => {
          const sitDays: string[] = [];
          let day = '2026-10-01';
          for (const wait of waits) {
            day = firstRestedDay({ restDays, sitDays, day: addDays(day, wait) });
            sitDays.push(day);
          }
          const record = restsOf({ restDays, sitDays, before: null });
          expect(record.broken).toEqual([]);
          expect(record.kept).toBe(record.times);
        },
      ),
    );
  });
});

describe('good sits', () => {
  const sit = (id: string, score: number | null, more: Partial<JudgedSit> = {}): JudgedSit => ({
    id,
    standId: 'oak',
    windows: 'morning',
    score,
    prime: false,
    ...more,
  });
  /** Scores 1 to 12: the better third are 9, 10, 11 and 12. */
  const scored = Array.from({ length: LEAST_SCORES }, (_, i) => sit(`s${i + 1}`, i + 1));

  it('are the better third of the kept scores, ties with the last of them too', () => {
    const found = goodSits(scored);
    expect(found).toMatchObject({ by: 'score', atLeast: 9, byStand: 0 });
    expect([...found.good]).toEqual(['s9', 's10', 's11', 's12']);
    expect(goodSits([...scored, sit('tie', 9), sit('low', 1), sit('low2', 1)]).good.has('tie')).toBe(true);
  });

  it('take a sit without a score for its stand’s in that window, then for its stand’s, and judge no other', () => {
    const best = [sit('b1', 50, { standId: 'best' }), sit('b2', 40, { standId: 'best', windows: 'evening' })];
    const found = goodSits([
      ...scored,
      ...best,
      sit('same', null, { standId: 'best' }),
      sit('day', null, { standId: 'best', windows: 'all_day' }),
      sit('mean', null),
      sit('unknown', null, { standId: 'new' }),
    ]);
    expect(['same', 'day', 'mean', 'unknown'].map((id) => found.good.has(id))).toEqual([true, true, false, false]);
    expect(found.judged.has('mean')).toBe(true);
    expect(found.judged.has('unknown')).toBe(false);
    expect(found.byStand).toBe(3);
  });

  it('go by the steward’s rating while few scores are kept', () => {
    const found = goodSits([...scored.slice(1), sit('prime', null, { prime: true })]);
    expect(found).toMatchObject({ by: 'rating', atLeast: null });
    expect([...found.good]).toEqual(['prime']);
    expect(found.judged.size).toBe(LEAST_SCORES);
  });
});

describe('who had the good sits', () => {
  it('gives the Gini coefficient of the example in the manual of the R package ineq (Zeileis): 0.4620911', () => {
    const incomes = [541, 1463, 2445, 3438, 4437, 5401, 6392, 8304, 11904, 22261];
    expect(gini(incomes)).toBeCloseTo(0.4620911, 7);
  });

  it('counts sits and good sits by member', () => {
    const of = (memberId: string, good: boolean, judged = true) => ({ memberId, good, judged });
    const shared = shareOut([of('b', false), of('a', true), of('a', true), of('a', false, false), of('c', false)]);
    expect(shared.members).toEqual([
      { memberId: 'a', sits: 3, judged: 2, good: 2 },
      { memberId: 'b', sits: 1, judged: 1, good: 0 },
      { memberId: 'c', sits: 1, judged: 1, good: 0 },
    ]);
    // By hand: good 0, 0, 2: differences sum to 2 x (2 + 2) = 8 over 2 x 9 x 2/3 = 12; sits 1, 1, 3: 8 over 2 x 9 x 5/3 = 30.
    expect(shared.ofGood).toBeCloseTo(8 / 12, 12);
    expect(shared.ofSits).toBeCloseTo(8 / 30, 12);
    expect(shareOut([])).toEqual({ members: [], ofSits: null, ofGood: null });
  });

  it('is held against luck: 2 good of 4 sits of two members come out 1 and 1 in 4 of 6 deals, else 2 and 0', () => {
    // All ways to pick 2 of 4: Gini 0 in four of six, 1/2 in two. 400 deals: the mean is off by 0.036 in nineteen of twenty.
    const lot = giniByLot([2, 2], 2);
    expect(Math.abs((lot?.mean ?? 1) - 1 / 6)).toBeLessThan(0.036);
    expect([lot?.low, lot?.high]).toEqual([0, 0.5]);
    // One good sit is always one member's: (n - 1) / n of n members.
    const one = giniByLot([5, 1, 1, 1], 1);
    expect([one?.mean, one?.low, one?.high].map((value) => value?.toFixed(9))).toEqual(Array(3).fill('0.750000000'));
    // All sits good: as uneven as the sits.
    expect(giniByLot([1, 2, 3], 6)?.mean).toBeCloseTo(8 / 36, 12);
    expect(giniByLot([3, 3], 0)).toBeNull();
    expect(giniByLot([], 0)).toBeNull();
  });

  it('calls uneven only what luck does not explain', () => {
    const lot = { mean: 0.2, low: 0.1, high: 0.3 };
    expect([0.05, 0.1, 0.2, 0.3, 0.31].map((value) => sharedAs(value, lot))).toEqual([
      'more_even',
      'by_lot',
      'by_lot',
      'by_lot',
      'less_even',
    ]);
    expect(giniByLot([8, 4], 4)).toEqual(giniByLot([8, 4], 4));
  });
});

describe('pressure over time', () => {
  const at = (eastM: number) => ({ eastM, northM: 0 });
  const sat = (days: number, place = at(0)): PressureEvent => ({
    at: days * DAY_MS,
    kind: 'sit',
    place,
    standId: null,
    bumped: 0,
  });

  it('is a sit’s whole weight as it ends, half of it 1.5 days later, a quarter after 3 (our half-life)', () => {
    const found = pressureSeries(
      at(0),
      [sat(1)],
      [0, 1, 2.5, 4, 16].map((n) => n * DAY_MS),
      DEFAULT_PRESSURE,
    );
    [0, 1, 0.5, 0.25, 0].forEach((value, i) => {
      expect(found[i]).toBeCloseTo(value, 9);
    });
  });

  it('is what the list reckons with at each instant, however the events come', () => {
    const event = fc.record({
      at: fc.integer({ min: 0, max: 60 * DAY_MS }),
      kind: fc.constantFrom(...PRESSURE_KINDS),
      place: fc.integer({ min: 0, max: 1500 }).map(at),
      standId: fc.constant(null),
      bumped: fc.integer({ min: 0, max: 4 }),
    });
    const instants = Array.from({ length: 60 }, (_, day) => day * DAY_MS);
    fc.assert(
      fc.property(fc.array(event, { maxLength: 40 }), (events) => {
        const near = nearEvents(at(0), events, DEFAULT_PRESSURE);
        const series = pressureSeries(at(0), events, instants, DEFAULT_PRESSURE);
        instants.forEach((instant, i) => {
          expect(series[i]).toBeCloseTo(pressureLeft(near, instant, DEFAULT_PRESSURE), 9);
        });
      }),
    );
  });
});

describe('bumps', () => {
  it('give their share with the score interval: 8 of 40, from 10.5 to 34.8 % (Wilson 1927)', () => {
    // By the formula of Wilson's paper, worked by hand with z = 1.96: 0.1050 and 0.3476.
    const found = countBumps(Array.from({ length: 40 }, (_, i) => ({ bumped: i < 8 })));
    expect(found).toMatchObject({ sits: 40, bumped: 8, share: { known: true, value: 0.2 } });
    expect(found.share.known && found.share.low).toBeCloseTo(0.105, 3);
    expect(found.share.known && found.share.high).toBeCloseTo(0.3476, 3);
    expect(countBumps([]).share).toEqual({ known: false, why: 'no_sits' });
  });

  it('are counted by the nearest of eight winds; a sit without a direction is in none', () => {
    expect([0, 22.4, 22.5, 90, 337.4, 337.5, 359.9, -45].map(windOf)).toEqual([
      'N',
      'N',
      'NE',
      'E',
      'NW',
      'N',
      'N',
      'NW',
    ]);
    const sit = (windFromDeg: number | null, bumped: boolean) => ({ standId: 'a', windFromDeg, bumped, inArc: null });
    const found = bumpsByWind([sit(300, true), sit(5, false), sit(320, false), sit(null, true)]);
    expect(found.map(({ wind, count }) => [wind, count.bumped, count.sits])).toEqual([
      ['N', 0, 1],
      ['NW', 1, 2],
    ]);
  });
});
