import { describe, expect, it } from 'vitest';
import { at, box, makeFeature, makeStand } from '../../../tests/helpers/small-ground';
import type { ScoredFeature, ScoredStand } from '../ground-types';
import { DEFAULT_SETTINGS } from '../settings';
import { DEFAULT_SETUP } from '../setup-check/setup-settings';
import { chainMovement, type MovementInput } from './chain-movement';

const line = (id: string, ...points: [number, number][]) =>
  makeFeature(id, 'travel_line', { type: 'line', points: points.map(([e, n]) => at(e, n)) });
const point = (eastM: number, northM: number) => ({ type: 'point' as const, at: at(eastM, northM) });
const seat = (id: string, eastM: number, over: Partial<ScoredStand> = {}) =>
  makeStand({
    id,
    at: at(eastM, -15),
    facingDeg: 0,
    shotRangeM: { bow: 25 },
    arcs: [{ fromDeg: 315, toDeg: 45, window: null }],
    ...over,
  });

/** Beds in the west, a scrape, and a plot in the east, on one line of 600 m. */
const FEATURES: ScoredFeature[] = [
  line('Long line', [0, 0], [600, 0]),
  makeFeature('Plot', 'food_plot', box(590, 10, 40, 40)),
  makeFeature('Scrape', 'scrape', point(200, 10)),
  makeFeature('Beds', 'bedding', box(-60, -20, 50, 40)),
  makeFeature('Far pond', 'water', point(300, 200)),
];
const chain = (over: Partial<MovementInput> = {}) =>
  chainMovement({
    features: FEATURES,
    stands: [seat('Oak', 200), seat('Corner', 580)],
    scoring: DEFAULT_SETTINGS,
    setup: DEFAULT_SETUP,
    month: 10,
    ...over,
  });

describe('lines of movement', () => {
  it('chain what lies on them in order, with distances along the line', () => {
    const [found] = chain();
    expect(found?.lengthM).toBeCloseTo(600, 6);
    expect(found?.stops.map((s) => [s.name, Math.round(s.alongM), Math.round(s.offM)])).toEqual([
      ['Beds', 0, 10],
      ['Scrape', 200, 10],
      ['Plot', 590, 10],
    ]);
    expect(found?.legs.map((leg) => [leg.from.name, leg.to.name, Math.round(leg.lengthM)])).toEqual([
      ['Beds', 'Scrape', 200],
      ['Scrape', 'Plot', 390],
    ]);
  });

  it('take what lies at one place of a line as one stop', () => {
    const ford = makeFeature('Ford', 'crossing', point(205, -5));
    expect(chain({ features: [...FEATURES, ford] })[0]?.stops.map((s) => s.name)).toEqual([
      'Beds',
      'Scrape and Ford',
      'Plot',
    ]);
  });

  it('hold the ground of each leg and gap, and where a stand reaches a leg', () => {
    const [found] = chain();
    const rounded = (points: { eastM: number; northM: number }[] = []) =>
      points.map(({ eastM, northM }) => [Math.round(eastM), Math.round(northM)]);
    expect(found?.legs.map((leg) => rounded(leg.points))).toEqual([
      [
        [0, 0],
        [200, 0],
      ],
      [
        [200, 0],
        [590, 0],
      ],
    ]);
    expect(rounded(found?.gaps[1]?.points)).toEqual([
      [225, 0],
      [555, 0],
    ]);
    const oak = found?.legs[0]?.stands[0];
    expect(rounded(oak ? [oak.at, oak.aim] : [])).toEqual([
      [200, -15],
      [200, 0],
    ]);
  });

  it('say which stand serves each leg, in which window and on which winds', () => {
    const avoid = seat('Corner', 580, { suitability: { morning: 'avoid', evening: 'prime' } });
    const [found] = chain({ stands: [seat('Oak', 200), avoid] });
    const served = found?.legs.map((leg) => leg.stands.map((s) => [s.name, s.windows.map((w) => w.window)]));
    expect(served).toEqual([
      [['Oak', ['morning', 'evening']]],
      [
        ['Oak', ['morning', 'evening']],
        ['Corner', ['evening']],
      ],
    ]);
    // NW to NE by points of 22.5 degrees.
    expect(found?.legs[0]?.stands[0]?.windows[0]?.winds).toEqual([0, 1, 2, 14, 15]);
  });

  it('count no stand whose every wind blows onto the line', () => {
    const south = seat('Oak', 200, { arcs: [{ fromDeg: 170, toDeg: 190, window: null }] });
    expect(chain({ stands: [south] })[0]?.legs.flatMap((leg) => leg.stands)).toEqual([]);
  });

  it('name the gaps that no stand reaches', () => {
    const [found] = chain();
    // A seat 15 m off the line reaches 25 m: 20 m of line each way.
    expect(found?.gaps.map((gap) => [Math.round(gap.fromM), Math.round(gap.toM), gap.between])).toEqual([
      [0, 175, 'Beds and Scrape'],
      [225, 555, 'Scrape and Plot'],
    ]);
    const all = Array.from({ length: 19 }, (_, i) => seat(`s${i}`, i * 35));
    expect(chain({ stands: all })[0]?.gaps).toEqual([]);
  });

  it('turn the deer with the time of day, and with the line', () => {
    expect(chain()[0]?.way).toEqual({ morning: -1, evening: 1 });
    const turned = [line('Long line', [600, 0], [0, 0]), ...FEATURES.slice(1)];
    expect(chain({ features: turned })[0]?.way).toEqual({ morning: 1, evening: -1 });
    const noFood = FEATURES.filter((f) => f.kind !== 'food_plot');
    const [found] = chain({ features: noFood });
    expect(found?.way).toEqual({ morning: -1, evening: 1 });
    expect(found?.stops.at(-1)?.name).toBe('its E end');
    expect(chain({ features: FEATURES.slice(0, 1) })[0]?.way).toEqual({ morning: null, evening: null });
  });
});
