import { describe, expect, it } from 'vitest';
import {
  at,
  box,
  makeApproach,
  makeFeature,
  makeInput,
  makeStand,
  PLACE,
  windowOf,
} from '../../../tests/helpers/small-ground';
import { apartDeg } from '../angles';
import { localToUtc } from '../day-time';
import type { ScoredApproach, ScoredFeature, ScoredStand } from '../ground-types';
import { DEFAULT_SETTINGS } from '../settings';
import { sunPosition } from '../sun';
import { checkSetup } from './check-setup';
import { DEFAULT_SETUP } from './setup-settings';
import type { Finding, SetupInput } from './setup-types';
import { makeWeigher } from './weigh-finding';

const DAYS = ['2023-09-15', '2023-10-15', '2023-11-15', '2023-12-15', '2024-01-15'];
const WINDOWS = DAYS.flatMap((day) => [windowOf('morning', day), windowOf('evening', day)]);

function setup(over: Partial<SetupInput>): SetupInput {
  return {
    place: PLACE,
    stands: [],
    features: [],
    approaches: [],
    cameras: [],
    days: DAYS,
    windows: WINDOWS,
    winds: null,
    settings: DEFAULT_SETUP,
    scoring: DEFAULT_SETTINGS,
    units: 'us',
    ...over,
  };
}

const point = (eastM: number, northM: number) => ({ type: 'point' as const, at: at(eastM, northM) });
const line = (...points: [number, number][]) => ({ type: 'line' as const, points: points.map(([e, n]) => at(e, n)) });
const seat = (id: string, eastM: number, northM: number, over: Partial<ScoredStand> = {}) =>
  makeStand({
    id,
    at: at(eastM, northM),
    facingDeg: 0,
    shotRangeM: { bow: 27 },
    arcs: [{ fromDeg: 315, toDeg: 45, window: null }],
    ...over,
  });
const byName = <T extends { id: string }>(list: T[], changed: T[]) =>
  list.map((one) => changed.find(({ id }) => id === one.id) ?? one);

/** A line of movement along 20 m north of a row of seats that look over it, walked to from the south. */
const STANDS = [
  seat('Oak', 0, 0),
  seat('Plot', -300, 0),
  seat('Draw', -340, -150),
  seat('Pond', 300, 0),
  seat('North', 150, 60),
  seat('West', -100, -200),
];
const FEATURES = [
  makeFeature('Long line', 'travel_line', line([-500, 20], [500, 20])),
  makeFeature('Draw line', 'travel_line', line([-380, 20], [-380, -300])),
  makeFeature('Beds', 'bedding', point(520, 60)),
  makeFeature('Clover', 'food_plot', box(-330, 15, 60, 40)),
  makeFeature('Scrape', 'scrape', point(0, 20)),
  makeFeature('White oak', 'mast', point(-325, -150)),
  makeFeature('Hole', 'water', point(300, 20)),
];
const WAYS = [
  makeApproach('Oak', [at(0, -300), at(0, 0)], { id: 'Oak way' }),
  makeApproach('Plot', [at(-200, -300), at(-300, 0)], { id: 'Plot way' }),
  makeApproach('Pond', [at(300, -300), at(300, 0)], { id: 'Pond way' }),
  makeApproach('North', [at(150, 300), at(150, 60)], { id: 'North way' }),
];
const MENDED = { stands: STANDS, features: FEATURES, approaches: WAYS };

/** The same ground with six things wrong. */
const PLANTED = {
  features: [
    ...FEATURES,
    // 1: behind the Oak seat. 4: a second scrape in one opening.
    makeFeature('Puddle', 'water', point(45, -50)),
    makeFeature('Scrape 2', 'scrape', point(10, 22)),
  ] satisfies ScoredFeature[],
  approaches: byName<ScoredApproach>(WAYS, [
    // 2: past the white oak in the dark. 5: across the line.
    makeApproach('Plot', [at(-300, -300), at(-300, 0)], { id: 'Plot way' }),
    makeApproach('North', [at(150, -300), at(150, 60)], { id: 'North way' }),
  ]),
  stands: byName<ScoredStand>(STANDS, [
    // 3: its only winds blow onto the water. 6: into the evening sun.
    seat('Pond', 300, 0, { arcs: [{ fromDeg: 170, toDeg: 190, window: null }] }),
    seat('West', -100, -200, { facingDeg: 250 }),
  ]),
};

const told = (found: Finding[]) => found.map((f) => [f.code, f.subject.name, f.stand?.name ?? null]);
const only = (code: string, input: SetupInput) => checkSetup(input).filter((f) => f.code === code);

describe('a ground with six planted faults', () => {
  it('has exactly those six', () => {
    expect(told(checkSetup(setup(PLANTED)))).toEqual([
      ['off_shot', 'Puddle', 'Oak'],
      ['beside_approach', 'White oak', 'Plot'],
      ['unhuntable', 'Hole', 'Pond'],
      ['crowded_scrapes', 'Scrape', 'Oak'],
      ['approach_crosses', 'North way', 'North'],
      ['seat_sun', 'West', 'West'],
    ]);
  });

  it('has none once mended', () => {
    expect(told(checkSetup(setup(MENDED)))).toEqual([]);
  });

  it('gives distance and bearing from the seat', () => {
    const [puddle] = checkSetup(setup(PLANTED));
    expect(puddle?.distanceM).toBeCloseTo(Math.hypot(45, 50), 6);
    expect(puddle?.bearingDeg).toBeCloseTo(138.01, 1);
    expect(puddle?.text).toBe('Puddle lies behind the seat of Oak, 74 yd SE of it');
  });

  it('tells the scrape to keep, and why', () => {
    const [found] = only('crowded_scrapes', setup(PLANTED));
    expect(found?.acts[0]?.text).toBe('Keep Scrape and take away Scrape 2');
    expect(found?.why).toContain('on a travel line, 22 yd from Oak, on the shot side, off the walk');
  });

  it('keeps a key but changes the print when the thing at fault is moved', () => {
    const [before] = checkSetup(setup(PLANTED));
    const moved = byName(PLANTED.features, [makeFeature('Puddle', 'water', point(48, -52))]);
    const [after] = checkSetup(setup({ ...PLANTED, features: moved }));
    expect(after?.key).toBe(before?.key);
    expect(after?.print).not.toBe(before?.print);
    const other = byName(PLANTED.stands, [seat('West', -100, -200, { facingDeg: 240 })]);
    const [untouched] = checkSetup(setup({ ...PLANTED, stands: other }));
    expect(untouched?.print).toBe(before?.print);
  });
});

describe('other faults', () => {
  it('finds what lies off every line of movement, and nothing where no line is drawn', () => {
    const lone = makeFeature('Lone apple', 'mast', point(0, -400));
    const [found] = only('off_lines', setup({ ...MENDED, features: [...FEATURES, lone] }));
    expect(found?.text).toBe('Lone apple is off every line of movement: the nearest, Draw line, is 430 yd away');
    expect(only('off_lines', setup({ ...MENDED, features: [lone] }))).toEqual([]);
  });

  it('finds a walk upwind of beds on the winds the stand is hunted on, weighed by how usual they are', () => {
    const beds = makeFeature('South beds', 'bedding', point(-10, -220));
    const input = setup({ ...MENDED, features: [...FEATURES, beds], stands: STANDS.slice(0, 1) });
    // Of the five points from NW to NE four carry scent within 30 degrees of the beds; NW carries it south-east of them.
    const [found] = only('approach_upwind', input);
    expect(found?.text).toBe('Oak way runs upwind of South beds on 80 % of the winds Oak is hunted on');
    const east = [seat('Oak', 0, 0, { arcs: [{ fromDeg: 240, toDeg: 270, window: null }] })];
    expect(only('approach_upwind', { ...input, stands: east })).toEqual([]);
    const onlyWest = Array.from({ length: 16 }, (_, i) => (i === 12 ? 1 : 0));
    const wide = [seat('Oak', 0, 0, { arcs: [{ fromDeg: 270, toDeg: 45, window: null }] })];
    const winds = { morning: onlyWest, evening: onlyWest };
    expect(only('approach_upwind', { ...input, stands: wide }).length).toBe(1);
    expect(only('approach_upwind', { ...input, stands: wide, winds })).toEqual([]);
  });

  it('finds a camera in the low sun and a bearing that has none within the same turn of it', () => {
    const cameras = [
      { id: 'c1', name: 'Gate camera', at: at(5, 5), facingDeg: 120 },
      { id: 'c2', name: 'North camera', at: at(9, 5), facingDeg: 0 },
      { id: 'c3', name: 'Any way', at: at(12, 5), facingDeg: null },
    ];
    const found = only('camera_sun', setup({ ...MENDED, cameras }));
    expect(told(found)).toEqual([['camera_sun', 'Gate camera', null]]);
    const better = Number(/to face (\d+)°/.exec(found[0]?.acts[0]?.text ?? '')?.[1]);
    for (const day of DAYS) {
      const dawn = localToUtc(day, '00:00', PLACE.zone);
      let minutes = 0;
      for (let t = dawn; t < dawn + 86_400_000; t += 60_000) {
        const { altitudeDeg, azimuthDeg } = sunPosition(t, PLACE.lat, PLACE.lon);
        if (altitudeDeg > 0 && altitudeDeg < 25 && apartDeg(better, azimuthDeg) < 30) minutes++;
      }
      expect(minutes).toBeLessThan(DEFAULT_SETUP.sunMinutes + 5);
    }
  });

  it('asks nothing of a stand that is avoided in both windows', () => {
    const stands = PLANTED.stands.map((s) => ({ ...s, suitability: { morning: 'avoid', evening: 'avoid' } as const }));
    const codes = checkSetup(setup({ ...PLANTED, stands })).map((f) => f.code);
    expect(codes).toEqual(['crowded_scrapes']);
  });
});

describe('weighing a finding by the core', () => {
  const { stands, features, approaches } = PLANTED;
  const ground = makeInput({ stands, features, approaches });
  const weigh = makeWeigher(ground, WINDOWS, null);
  const find = (code: string) => checkSetup(setup(PLANTED)).find((f) => f.code === code) as Finding;

  it('gains quiet by taking away what scent reaches, on a wind of the stand', () => {
    const effect = weigh(find('unhuntable'));
    expect(effect?.windFromDeg).toBe(180);
    expect(effect?.measure).toBe('quiet');
    expect(effect && effect.after - effect.before).toBeGreaterThan(1);
  });

  it('gains promise by turning a seat from the sun', () => {
    const effect = weigh(find('seat_sun'));
    expect(effect?.measure).toBe('promise');
    expect(effect && effect.after - effect.before).toBeGreaterThan(0.5);
  });

  it('remembers a stand as it is without changing what comes out', () => {
    const [first, again] = [weigh(find('unhuntable')), weigh(find('unhuntable'))];
    expect(again).toEqual(first);
    expect(makeWeigher(ground, WINDOWS, null)(find('unhuntable'))).toEqual(first);
  });

  it('has nothing to hold a way against where it is the only one', () => {
    expect(weigh(find('approach_crosses'))).toBeNull();
  });
});
