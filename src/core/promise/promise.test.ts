import { describe, expect, it } from 'vitest';
import type { ScoredFeature, ScoredStand } from '../ground-types';
import { crosswindFactor, crosswindShare } from './crosswind';
import { featuresInRange, shotRangeM } from './in-range';
import { promiseSeated } from './promise-factors';
import { DEFAULT_PROMISE } from './promise-settings';
import { clubRate, shrunkRate, sightingsFactor } from './sightings';
import { clearShare, sunInEyes } from './sun-in-eyes';
import { rainFactor, strongWindFactor } from './weather-effects';

const s = DEFAULT_PROMISE;
const stand: ScoredStand = {
  id: 'a',
  name: 'A',
  kind: 'ladder',
  at: { eastM: 0, northM: 0 },
  seatHeightM: 5,
  facingDeg: 0,
  shotSide: 'left',
  shotRangeM: { bow: 27, rifle: 150 },
  shelter: 'edge',
  arcs: [],
  suitability: { morning: 'prime', evening: 'prime' },
  restDays: 3,
  drainBearingDeg: null,
  slopePercent: null,
};
const plotAt = (eastM: number, northM: number): ScoredFeature => ({
  id: 'p',
  name: 'Plot',
  kind: 'food_plot',
  shape: { type: 'point', at: { eastM, northM } },
  months: [11],
  use: null,
});

describe('sightings', () => {
  it('gives 0.730 deer an hour for 487 hunts of 3.7 h with 2.7 deer each (Meier et al. 2025)', () => {
    const log = [{ standId: 'a', sits: 487, hours: 487 * 3.7, deer: 487 * 2.7 }];
    expect(clubRate(log, s)).toBeCloseTo(0.7297, 4);
    expect(clubRate([], s)).toBeCloseTo(0.73, 2);
  });

  it('shrinks by the gamma-Poisson mean: prior 20 h at 0.5, 5 deer in 5 h -> (5 + 10) / 25 = 0.6', () => {
    expect(shrunkRate({ deer: 5, hours: 5 }, 0.5, 20)).toBeCloseTo(0.6, 12);
    expect(shrunkRate(null, 0.5, 20)).toBe(0.5);
    expect(shrunkRate({ deer: 1000, hours: 1000 }, 0.5, 20)).toBeCloseTo(1, 1);
  });

  it('lets one lucky sit move a stand little and a season move it within bounds', () => {
    const lucky = sightingsFactor({ standId: 'a', sits: 1, hours: 3, deer: 8 }, 0.7, s);
    expect(lucky).toBeLessThan(1.25);
    expect(sightingsFactor({ standId: 'a', sits: 200, hours: 600, deer: 0 }, 0.7, s)).toBe(s.sightingsLeast);
    expect(sightingsFactor(null, 0.7, s)).toBe(1);
  });
});

describe('range and shot side', () => {
  it('takes the range of the weapon, else the longest the stand allows, else a bow shot', () => {
    expect(shotRangeM(stand, 'bow')).toBe(27);
    expect(shotRangeM(stand, null)).toBe(150);
    expect(shotRangeM({ ...stand, shotRangeM: {} }, null)).toBeCloseTo(27.4);
  });

  it('counts what is in range, less of what is off the shot side, and nothing beyond twice the range', () => {
    const [left, right, far, edge] = [plotAt(-20, 0), plotAt(20, 0), plotAt(-60, 0), plotAt(-40.5, 0)].map(
      (f) => featuresInRange(stand, [f], 'bow', s)[0]?.share,
    );
    expect(left).toBe(1);
    expect(right).toBe(s.offSideFactor);
    expect(far).toBeUndefined();
    expect(edge).toBeCloseTo(0.5, 6);
    expect(featuresInRange({ ...stand, shotSide: 'either' }, [plotAt(20, 0)], 'bow', s)[0]?.share).toBe(1);
  });
});

describe('wind over a travel line', () => {
  it('gains across, loses along, and is neutral where direction is unknown', () => {
    expect(crosswindFactor(crosswindShare(90, 0), s)).toBeCloseTo(1 + s.crosswindSpan, 12);
    expect(crosswindFactor(crosswindShare(180, 0), s)).toBeCloseTo(1 - s.crosswindSpan, 12);
    expect(crosswindFactor(crosswindShare(null, 0), s)).toBe(1);
  });
});

describe('sun in the eyes', () => {
  it('blinds a sitter who faces a low sun, not one who faces away, nor under 20 degrees of height passed', () => {
    expect(sunInEyes(110, 3, 115, s)).toBeGreaterThan(0.8);
    expect(sunInEyes(290, 3, 115, s)).toBe(0);
    expect(sunInEyes(110, 20, 115, s)).toBe(0);
    expect(sunInEyes(110, -1, 115, s)).toBe(0);
    expect(sunInEyes(null, 3, 115, s)).toBe(0);
    expect(sunInEyes(355, 3, 5, s)).toBe(sunInEyes(5, 3, 355, s));
  });

  it('counts on clear days only', () => {
    expect(clearShare(0, s)).toBe(1);
    expect(clearShare(100, s)).toBe(0);
    expect(clearShare(null, s)).toBe(0.5);
  });
});

describe('rain, wind and a late entry', () => {
  it('costs with strength, within bounds', () => {
    expect(rainFactor(0.2, s)).toBe(1);
    expect(rainFactor(50, s)).toBeCloseTo(1 - s.rainCost, 12);
    expect(rainFactor(null, s)).toBe(1);
    expect(strongWindFactor(3, s)).toBe(1);
    expect(strongWindFactor(40, s)).toBeCloseTo(1 - s.windCost, 12);
  });

  it('gives the whole promise for the whole sit, none for none, and about half for half', () => {
    expect(promiseSeated(0.4, 1)).toBeCloseTo(0.4, 12);
    expect(promiseSeated(0.4, 0)).toBe(0);
    expect(promiseSeated(0.4, 0.5)).toBeGreaterThan(0.2);
    expect(promiseSeated(0.4, 0.5)).toBeLessThan(0.24);
  });

  it('gives moon and barometer no weight (Webb et al. 2010: no effect of the moon)', () => {
    expect(s.moonWeight).toBe(0);
    expect(s.barometerWeight).toBe(0);
  });
});
