import { describe, expect, it } from 'vitest';
import type { FeatureKind, ScoredFeature } from './ground-types';
import {
  DEFAULT_WHEREABOUTS,
  type SunMarks,
  shareAt,
  thinCrowded,
  timeOfDay,
  timeWeights,
  usesOf,
} from './whereabouts';

const HOUR = 3_600_000;
const noon = Date.UTC(2023, 10, 11, 17);
const sun: SunMarks = {
  rise: noon - 5 * HOUR,
  set: noon + 5 * HOUR,
  civilDawn: noon - 5.5 * HOUR,
  civilDusk: noon + 5.5 * HOUR,
  polar: 'none',
};
const feature = (kind: FeatureKind, over: Partial<ScoredFeature> = {}): ScoredFeature => ({
  id: kind,
  name: kind,
  kind,
  shape: { type: 'point', at: { eastM: 0, northM: 0 } },
  months: [9, 10, 11, 12],
  use: null,
  ...over,
});
const share = (kind: FeatureKind, at: number, month = 12) =>
  shareAt(usesOf(feature(kind), month, DEFAULT_WHEREABOUTS), timeWeights(at, sun));

describe('where deer are', () => {
  it('names the time of day', () => {
    const names = [-8, -5.3, -3.4, 0, 3, 5.2, 8].map((h) => timeOfDay(noon + h * HOUR, sun));
    expect(names).toEqual(['night', 'dawn', 'morning', 'midday', 'afternoon', 'dusk', 'night']);
  });

  it('gives weights that sum to one and change without jumps', () => {
    let before = timeWeights(noon - 12 * HOUR, sun);
    for (let at = noon - 12 * HOUR; at <= noon + 12 * HOUR; at += 60_000) {
      const now = timeWeights(at, sun);
      expect(now.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 12);
      expect(Math.max(...now.map((w, i) => Math.abs(w - (before[i] as number))))).toBeLessThan(0.05);
      before = now;
    }
  });

  it('puts food plots up to five times as often in use by night as by day (Henderson et al. 2023)', () => {
    const ratio = share('food_plot', noon - 9 * HOUR) / share('food_plot', noon - 3 * HOUR);
    expect(ratio).toBeGreaterThan(3);
    expect(ratio).toBeLessThanOrEqual(5.5);
  });

  it('puts most use of scrapes after dark (85 % of male visits: Alexy et al. 2001)', () => {
    let night = 0;
    let all = 0;
    for (let at = noon - 12 * HOUR; at < noon + 12 * HOUR; at += HOUR / 4) {
      const use = share('scrape', at);
      all += use;
      if (at < (sun.civilDawn as number) || at > (sun.civilDusk as number)) night += use;
    }
    expect(night / all).toBeGreaterThan(0.75);
    expect(night / all).toBeLessThan(0.95);
  });

  it('puts beds by day, water at midday, travel lines at dawn and dusk (practice)', () => {
    expect(share('bedding', noon)).toBeGreaterThan(3 * share('bedding', noon - 9 * HOUR));
    expect(share('water', noon)).toBeGreaterThan(share('water', noon - 5.2 * HOUR));
    expect(share('travel_line', noon - 5.2 * HOUR)).toBeGreaterThan(2 * share('travel_line', noon));
    expect(share('travel_line', noon + 5.2 * HOUR)).toBeGreaterThan(2 * share('travel_line', noon));
  });

  it('lets a steward’s own table stand, keeps months, and makes the rut matter little', () => {
    const own = usesOf(feature('scrape', { use: { midday: 0.9 } }), 11, DEFAULT_WHEREABOUTS);
    expect(own[3]).toBe(0.9);
    expect(usesOf(feature('mast', { months: [9] }), 11, DEFAULT_WHEREABOUTS)).toEqual([0, 0, 0, 0, 0, 0]);
    const rut = share('travel_line', noon - 3 * HOUR, 11) / share('travel_line', noon - 3 * HOUR, 12);
    expect(rut).toBeGreaterThan(1);
    expect(rut).toBeLessThan(1.3);
  });

  it('does not fill a ground with deer by mapping it more finely', () => {
    const uses = Array.from({ length: 12 }, () => usesOf(feature('bedding'), 12, DEFAULT_WHEREABOUTS));
    const all = Int32Array.from(uses.keys());
    const thinned = thinCrowded(
      uses,
      uses.map(() => all),
      DEFAULT_WHEREABOUTS,
    );
    const middaySum = thinned.reduce((sum, use) => sum + (use[3] ?? 0), 0);
    expect(middaySum).toBeCloseTo(DEFAULT_WHEREABOUTS.mostInUse, 12);
    const [alone] = thinCrowded(uses.slice(0, 1), [Int32Array.of(0)], DEFAULT_WHEREABOUTS);
    expect(alone).toEqual(uses[0]);
  });

  it('says midday under a midnight sun and night in a polar night', () => {
    const none = { rise: null, set: null, civilDawn: null, civilDusk: null };
    expect(timeOfDay(noon, { ...none, polar: 'up_all_day' })).toBe('midday');
    expect(timeOfDay(noon, { ...none, polar: 'down_all_day' })).toBe('night');
  });
});
