import { describe, expect, it } from 'vitest';
import { at, box, makeApproach, makeFeature, makeStand, PLACE, windowOf } from '../../../tests/helpers/small-ground';
import type { ScoredFeature, ScoredStand } from '../ground-types';
import { DEFAULT_SETTINGS } from '../settings';
import { checkSetup } from './check-setup';
import { DEFAULT_SETUP } from './setup-settings';
import type { SetupInput } from './setup-types';

const DAYS = ['2023-09-15', '2023-10-15', '2023-11-15', '2023-12-15', '2024-01-15'];
const point = (eastM: number, northM: number) => ({ type: 'point' as const, at: at(eastM, northM) });
const line = (...points: [number, number][]) => ({ type: 'line' as const, points: points.map(([e, n]) => at(e, n)) });
/** Looks north over nothing, with a north wind; hunted in the morning. */
const seat = (over: Partial<ScoredStand> = {}) =>
  makeStand({
    id: 'Oak',
    facingDeg: 0,
    shotRangeM: { bow: 27 },
    arcs: [{ fromDeg: 315, toDeg: 45, window: null }],
    suitability: { morning: 'prime', evening: 'avoid' },
    ...over,
  });
const fromSouth = makeApproach('Oak', [at(0, -400), at(0, 0)], { id: 'South way' });
const fromEast = makeApproach('Oak', [at(400, 0), at(0, 0)], { id: 'East way' });

function check(over: Partial<SetupInput>) {
  return checkSetup({
    place: PLACE,
    stands: [seat()],
    features: [],
    approaches: [],
    cameras: [],
    days: DAYS,
    windows: DAYS.flatMap((day) => [windowOf('morning', day), windowOf('evening', day)]),
    winds: null,
    settings: DEFAULT_SETUP,
    scoring: DEFAULT_SETTINGS,
    units: 'us',
    ...over,
  });
}
const codes = (over: Partial<SetupInput>) => check(over).map((f) => [f.code, f.subject.name]);

describe('an oak beside a walk', () => {
  const oak = makeFeature('White oak', 'mast', point(-10, -200));

  it('is no fault where there is no other way: nobody can take it away', () => {
    expect(codes({ features: [oak], approaches: [fromSouth] })).toEqual([]);
  });

  it('is one where another way passes nothing, which is then what to do', () => {
    const [found, ...more] = check({ features: [oak], approaches: [fromSouth, fromEast] });
    expect(more).toEqual([]);
    expect(found?.text).toBe('White oak lies 11 yd from the walk in by South way to Oak, 219 yd S of the seat');
    expect(found?.acts[0]).toEqual({ act: 'new_way', text: 'Walk in to Oak by East way instead', work: null });
    expect(found?.trial).toMatchObject({ change: 'without_approach', approachId: 'South way' });
  });

  it('is none where the other way passes deer as well', () => {
    const corn = makeFeature('Corn', 'crop', box(150, 10, 60, 60));
    const found = codes({ features: [oak, corn], approaches: [fromSouth, fromEast] });
    // Corn empties by the morning and can be waited for; the oak holds its deer.
    expect(found).toEqual([['beside_approach', 'Corn']]);
  });

  it('is one again where waiting past daybreak would find it empty', () => {
    const early: ScoredFeature = { ...oak, use: { night: 0.6, dawn: 0.4, morning: 0.1 } };
    const [found] = check({ features: [early], approaches: [fromSouth] });
    expect(found?.acts[0]).toMatchObject({
      act: 'other_time',
      text: 'Walk in past White oak only half an hour after daybreak',
    });
  });

  it('counts at the hours the walk is used alone', () => {
    const byNight: ScoredFeature = { ...oak, use: { night: 0.9, dawn: 0.9, morning: 0, midday: 0, afternoon: 0 } };
    const evenings = seat({ suitability: { morning: 'avoid', evening: 'prime' } });
    const inOnly = [fromSouth, fromEast].map((way) => ({ ...way, direction: 'in' as const }));
    expect(codes({ features: [byNight], approaches: inOnly })).toEqual([['beside_approach', 'White oak']]);
    expect(codes({ stands: [evenings], features: [byNight], approaches: inOnly })).toEqual([]);
  });

  it('is told once for all the walks that pass it, and again a scrape even on the only way', () => {
    const other = seat({ id: 'Elm', at: at(30, 20) });
    const ways = [fromSouth, fromEast, makeApproach('Elm', [at(10, -400), at(30, 20)], { id: 'Elm way' })];
    const early: ScoredFeature = { ...oak, use: { night: 0.6, dawn: 0.4, morning: 0.1 } };
    const found = check({ stands: [seat(), other], features: [early], approaches: ways });
    expect(found.map((f) => [f.code, f.stand?.name, f.also.map((s) => s.name)])).toEqual([
      ['beside_approach', 'Oak', ['Elm']],
    ]);
    expect(found[0]?.why).toContain('So does Elm way to Elm.');
    const scrape = makeFeature('Scrape', 'scrape', point(-10, -200));
    expect(codes({ features: [scrape], approaches: [fromSouth] })).toContainEqual(['beside_approach', 'Scrape']);
  });
});

describe('what cannot be moved near a seat', () => {
  it('counts behind it, not out of range before it', () => {
    expect(codes({ features: [makeFeature('Oaks', 'mast', box(-10, 60, 20, 20))] })).toEqual([]);
    expect(codes({ features: [makeFeature('Oaks', 'mast', box(-10, -80, 20, 20))] })).toEqual([['off_shot', 'Oaks']]);
    expect(codes({ features: [makeFeature('Hole', 'water', point(0, 60))] })).toEqual([['off_shot', 'Hole']]);
  });

  it('is left to another stand that has it in shot', () => {
    const oaks = makeFeature('Oaks', 'mast', box(-10, -80, 20, 20));
    const south = seat({ id: 'South', at: at(0, -100) });
    expect(codes({ stands: [seat(), south], features: [oaks] })).toEqual([]);
  });

  it('is not held against a club where nobody sits: only what the club made is', () => {
    const far = (kind: ScoredFeature['kind']) => codes({ features: [makeFeature('Far', kind, point(0, 400))] });
    expect(far('mast')).toEqual([]);
    expect(far('scrape')).toEqual([['unhuntable', 'Far']]);
    expect(far('food_plot')).toEqual([['unhuntable', 'Far']]);
  });
});

describe('ways and lines', () => {
  const path = makeFeature('Path', 'travel_line', line([-300, -200], [300, -200]));
  const crossed = (over: Partial<SetupInput>) => codes({ features: [path], approaches: [fromSouth], ...over });

  it('cross on dry ground, where deer come along in the hours of the sit', () => {
    expect(crossed({})).toEqual([['approach_crosses', 'South way']]);
    const creek = makeFeature('Creek', 'water', line([-300, -205], [300, -205]));
    expect(crossed({ features: [path, creek] })).toEqual([]);
    const seldom: ScoredFeature = { ...path, use: { dawn: 0.1, morning: 0.1 } };
    expect(crossed({ features: [seldom] })).toEqual([]);
  });

  it('that cross at one place are one finding, and a way with several faults is one too', () => {
    const near = seat({ id: 'Elm', at: at(20, -100), facingDeg: null });
    const ways = [fromSouth, makeApproach('Elm', [at(5, -400), at(20, -100)], { id: 'Elm way' })];
    const found = check({ stands: [seat(), near], features: [path], approaches: ways });
    expect(found.map((f) => [f.code, f.subject.name, f.also.map((s) => s.name)])).toEqual([
      ['approach_crosses', 'Elm way', ['Oak']],
    ]);
    const beds = makeFeature('Beds', 'bedding', point(0, -420));
    const [both, ...more] = check({ features: [path, beds], approaches: [fromSouth] });
    expect(more).toEqual([]);
    expect(both?.code).toBe('approach_upwind');
    expect(both?.text).toMatch(
      /^South way runs upwind of Beds on \d+ % of the winds Oak is hunted on, and crosses Path$/,
    );
  });
});

describe('the order of things', () => {
  it('changes neither what is found nor its prints', () => {
    const lines = [-150, -250, -300].map((north, i) =>
      makeFeature(`Path ${i}`, 'travel_line', line([-300, north], [300, north])),
    );
    const more = [
      makeFeature('Beds', 'bedding', point(0, -420)),
      makeFeature('Other beds', 'bedding', point(30, -430)),
      makeFeature('Scrape', 'scrape', point(20, -60)),
      makeFeature('Scrape 2', 'scrape', point(35, -60)),
    ];
    const features = [...lines, ...more];
    const approaches = [fromSouth, fromEast];
    const marks = (over: Partial<SetupInput>) => check(over).map(({ key, print, text }) => [key, print, text]);
    const found = marks({ features, approaches });
    expect(found.length).toBeGreaterThan(2);
    expect(marks({ features: features.toReversed(), approaches: approaches.toReversed() })).toEqual(found);
  });
});

describe('a scrape in the opening of a plot on a line', () => {
  it('is on the line with it', () => {
    const path = makeFeature('Path', 'travel_line', line([-300, 200], [300, 200]));
    const plot = makeFeature('Plot', 'food_plot', box(-20, 220, 40, 100));
    const scrape = makeFeature('Scrape', 'scrape', point(0, 330));
    const off = (features: ScoredFeature[]) => check({ stands: [], features }).map((f) => f.code);
    expect(off([path, scrape])).toEqual(['off_lines']);
    expect(off([path, plot, scrape])).toEqual([]);
  });
});

describe('low sun', () => {
  const west = seat({ facingDeg: 245, suitability: { morning: 'avoid', evening: 'prime' }, shelter: 'edge' });

  it('troubles a seat in the open that looks into it for most of the season, not one in dense wood', () => {
    expect(codes({ stands: [west] })).toEqual([['seat_sun', 'Oak']]);
    expect(codes({ stands: [{ ...west, shelter: 'dense_wood' }] })).toEqual([]);
    // The September sun sets about west, the others farther south.
    const september = { ...west, facingDeg: 300 };
    expect(codes({ stands: [september] })).toEqual([]);
    expect(codes({ stands: [september], settings: { ...DEFAULT_SETUP, sunMonths: 1 } })).toEqual([['seat_sun', 'Oak']]);
  });

  it('is turned from only where what is in shot stays in shot', () => {
    const right = { ...west, shotSide: 'right' as const };
    const acts = (features: ScoredFeature[]) =>
      check({ stands: [right], features }).flatMap((f) => f.acts.map(({ act }) => act));
    expect(acts([])).toEqual(['turn', 'block']);
    // In shot lie the bearings from 20 degrees left of where it faces to 135 right: 230 and 15 only while it faces 240 to 250.
    const left = makeFeature('Left oak', 'mast', point(-15.3, -12.9));
    const back = makeFeature('Right oak', 'mast', point(5.2, 19.3));
    expect(acts([left, back])).toEqual(['block']);
  });
});
