import { describe, expect, it } from 'vitest';
import { at, box, makeApproach, makeFeature, windowOf } from '../../../tests/helpers/small-ground';
import { bearingDeg, distanceM, pointAt } from '../geometry';
import { DEFAULT_SETTINGS } from '../settings';
import { DEFAULT_APPROACH } from './approach-settings';
import { entriesFor } from './entries';
import { WALK_BINS, type WalkWind, walkChance } from './walk-chance';
import { buildWalkGround, circleOf, sourcesAlong } from './walk-ground';
import { walkPlumes, walkTable } from './walk-scent';
import { routeLengths, walkSeconds } from './walk-times';

const MIN = 60_000;
const s = DEFAULT_APPROACH;

function windFrom(deg: number, speedMps = 2): WalkWind {
  const bin = (deg / 360) * WALK_BINS;
  return {
    low: Int32Array.of(Math.floor(bin) % WALK_BINS),
    high: Int32Array.of((Math.floor(bin) + 1) % WALK_BINS),
    part: Float64Array.of(bin - Math.floor(bin)),
    weights: Float64Array.of(1),
    perSpeed: Float64Array.of(1 / speedMps),
    anyWeight: 0,
    anyPerSpeed: 1,
    speedMps,
    stability: 3,
  };
}

function chanceOf(
  approach = makeApproach('s', [at(0, -400), at(0, 0)]),
  feature = makeFeature('beds', 'bedding', box(150, -250, 60, 60)),
  wind: WalkWind | null = null,
  share = 0.6,
) {
  const ground = buildWalkGround(approach, [feature], [circleOf(feature)], s);
  const table = wind ? walkTable(ground, wind.stability, walkPlumes(DEFAULT_SETTINGS.scent, s)) : null;
  return walkChance(ground, table, { dark: 0, shares: Float64Array.of(share), wind }, s);
}

describe('times of a walk', () => {
  it('drives the driven part and walks the rest, up to the whole minute', () => {
    const way = makeApproach('s', [at(0, -1000), at(0, -400), at(0, 0)], { vehicleToIndex: 1 });
    expect(routeLengths(way)).toEqual({ drivenM: 600, walkedM: 400 });
    expect(walkSeconds(way, s)).toBe(Math.ceil((600 / s.vehicleSpeedMps + 400 / s.walkingSpeedMps) / 60) * 60);
    expect(walkSeconds(way, s) % 60).toBe(0);
  });

  it('looks at the walk at points no farther apart than set, the ends among them', () => {
    const sources = sourcesAlong(makeApproach('s', [at(0, 0), at(0, 95), at(300, 95)]), 40);
    for (let i = 1; i < sources.length; i++) {
      const [a, b] = [sources[i - 1], sources[i]];
      if (a && b) expect(distanceM(a.at, b.at)).toBeLessThanOrEqual(40 + 1e-9);
    }
    expect(sources[0]?.at).toEqual(at(0, 0));
    expect(sources.at(-1)?.at).toEqual(at(300, 95));
  });
});

describe('times of going in', () => {
  const dawn = windowOf('morning').startAt + 2 * MIN;
  const sun = {
    rise: dawn + 29 * MIN,
    set: dawn + 590 * MIN,
    civilDawn: dawn,
    civilDusk: dawn + 620 * MIN,
    polar: 'none' as const,
  };

  it('tries before light, 30 and 60 minutes after daybreak and late in a morning', () => {
    const tries = entriesFor(windowOf('morning'), sun, s);
    expect(tries.map((t) => t.entry)).toEqual(['before_light', 'after_daybreak_30', 'after_daybreak_60', 'midday']);
    expect(tries.map((t) => Math.round((t.inBy - dawn) / MIN)).slice(0, 3)).toEqual([-20, 30, 60]);
  });

  it('tries midday and the window’s start in an evening, and never less than half an hour before the end', () => {
    const window = windowOf('evening');
    const tries = entriesFor(window, sun, s);
    expect(tries.map((t) => t.entry)).toEqual(['midday', 'afternoon']);
    for (const t of tries) expect(t.inBy).toBeLessThanOrEqual(window.endAt - 30 * MIN);
    const short = entriesFor({ ...windowOf('morning'), endAt: dawn + 40 * MIN }, sun, s);
    expect(short.map((t) => t.entry)).toEqual(['before_light']);
  });
});

describe('the chance a walk alerts deer', () => {
  it('is scent and senses with a wind on them, senses alone with a wind off them or no forecast', () => {
    const on = chanceOf(undefined, undefined, windFrom(270));
    const off = chanceOf(undefined, undefined, windFrom(90));
    const unknown = chanceOf();
    expect(on.chance).toBeGreaterThan(off.chance + 0.08);
    expect(unknown.chance).toBeGreaterThan(0);
    expect(on.worst?.feature).toBe(0);
  });

  it('grows with the deer that are there, and falls as the way is moved off', () => {
    const near = chanceOf(undefined, undefined, windFrom(270), 0.6).chance;
    expect(chanceOf(undefined, undefined, windFrom(270), 0.1).chance).toBeLessThan(near);
    let before = 1;
    for (const off of [0, 60, 120, 180, 230]) {
      const way = makeApproach('s', [at(-off, -400), at(-off, 0)]);
      const { chance } = chanceOf(way, undefined, windFrom(270));
      expect(chance).toBeLessThan(before);
      before = chance;
    }
  });

  it('leaves only unmapped deer when nothing mapped is within reach', () => {
    const far = makeFeature('far', 'bedding', box(2000, 2000, 50, 50));
    expect(chanceOf(undefined, far, windFrom(270)).chance).toBeCloseTo(1 - (1 - s.unmappedPer100M) ** 4, 12);
  });

  it('lays scent down the wind only: zero for a place straight up the wind, most straight down it', () => {
    const way = makeApproach('s', [at(0, 0)]);
    const spot = makeFeature('spot', 'water', { type: 'point', at: pointAt(at(0, 0), 60, 120) });
    const ground = buildWalkGround(way, [spot], [circleOf(spot)], s);
    const table = walkTable(ground, 3, walkPlumes(DEFAULT_SETTINGS.scent, s));
    const most = table.indexOf(Math.max(...table));
    expect(most * (360 / WALK_BINS)).toBeCloseTo(bearingDeg(at(0, 0), pointAt(at(0, 0), 240, 1)), 6);
    expect(table[(most + WALK_BINS / 2) % WALK_BINS]).toBe(0);
  });

  it('counts every wind alike for a place the walk goes through', () => {
    const plot = makeFeature('plot', 'food_plot', box(-50, -50, 100, 100));
    const ground = buildWalkGround(makeApproach('s', [at(0, 0)]), [plot], [circleOf(plot)], s);
    const table = walkTable(ground, 3, walkPlumes(DEFAULT_SETTINGS.scent, s));
    expect(Math.min(...table)).toBe(Math.max(...table));
    expect(Math.min(...table)).toBeGreaterThan(0);
  });
});
