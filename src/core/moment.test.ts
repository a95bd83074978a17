import { describe, expect, it } from 'vitest';
import {
  at,
  box,
  DAY,
  makeApproach,
  makeFeature,
  makeForecast,
  makeInput,
  makeStand,
  windowOf,
} from '../../tests/helpers/small-ground';
import { tryWays } from './approach/try-ways';
import { walkStretches } from './approach/walk-stretches';
import { bearingDeg, distanceM } from './geometry';
import { frameGround } from './ground-frame';
import { gridAbout, momentAt, walkInStretches } from './moment';
import { DEFAULT_SETTINGS } from './settings';
import { frameSits } from './sit-frame';
import { judgeSit } from './verdict';

const stand = makeStand({ id: 'seat', at: at(0, 0) });
const food = makeFeature('plot', 'food_plot', box(150, -60, 80, 80));
const way = makeApproach('seat', [at(600, -20), at(0, 0)]);
const round = makeApproach('seat', [at(600, -20), at(600, 700), at(0, 700), at(0, 0)], { id: 'round' });

function frameOf(fromDeg: number, approaches = [way]) {
  const window = windowOf('morning', DAY);
  const forecast = makeForecast(window, fromDeg, 5);
  const ground = frameGround(makeInput({ stands: [stand], features: [food], approaches, forecast, window }));
  const frame = frameSits(ground, window, forecast, window.startAt - 3_600_000, 'full');
  const one = ground.stands[0];
  if (!one) throw new Error('no stand');
  return { frame, one };
}

describe('a moment at a stand', () => {
  it.each([0, 90, 225])('scent lies downwind of a wind from %d', (fromDeg) => {
    const { frame, one } = frameOf(fromDeg);
    const grid = gridAbout(one, 800, 20, 400);
    const moment = momentAt(frame, one, 2, grid);
    const values = moment?.field?.values ?? new Float64Array();
    expect(values).toHaveLength(40 * 40);
    let east = 0;
    let north = 0;
    values.forEach((value, i) => {
      east += value * (grid.origin.eastM + ((i % grid.columns) + 0.5) * grid.cellM);
      north += value * (grid.origin.northM + (Math.floor(i / grid.columns) + 0.5) * grid.cellM);
    });
    const toward = bearingDeg(at(0, 0), at(east, north));
    expect(Math.abs(((toward - fromDeg - 180 + 540) % 360) - 180)).toBeLessThan(10);
  });

  it('has no field and no wind without a forecast, and is null after the sit', () => {
    const window = windowOf('morning', DAY);
    const ground = frameGround(makeInput({ stands: [stand], forecast: null, window }));
    const frame = frameSits(ground, window, null, window.startAt, 'list');
    const one = ground.stands[0];
    if (!one) throw new Error('no stand');
    const grid = gridAbout(one, 800, 20, 400);
    expect(momentAt(frame, one, 0, grid)).toMatchObject({ wind: null, field: null });
    expect(momentAt(frame, one, 99, grid)).toBeNull();
  });
});

describe('the walk in, piece by piece', () => {
  it('is as long as the way, and never costs more in a piece than in whole', () => {
    for (const fromDeg of [0, 60, 120, 180, 240, 300]) {
      const { frame, one } = frameOf(fromDeg, [way, round]);
      const best = judgeSit(frame, one, []).approach;
      const approach = [way, round].find((a) => a.id === best?.approachId);
      if (!best || !approach) throw new Error('no way');
      const stretches = walkInStretches(frame, best, approach);
      expect(stretches.reduce((sum, s) => sum + s.lengthM, 0)).toBeCloseTo(
        approach.points.slice(1).reduce((sum, p, i) => sum + distanceM(approach.points[i] ?? p, p), 0),
        6,
      );
      for (const stretch of stretches) {
        expect(stretch.lengthM).toBeLessThanOrEqual(DEFAULT_SETTINGS.approach.spacingM + 1e-9);
        expect(stretch.chance).toBeLessThanOrEqual(best.inChance + 1e-9);
      }
    }
  });

  it('costs most where it passes the food, in the dark, and names it', () => {
    const { frame, one } = frameOf(90);
    const tried = tryWays(
      one.waysIn,
      [],
      [{ entry: 'before_light', inBy: frame.window.stepAts[0] ?? 0 }],
      frame.window.window.endAt,
      frame.walks,
    );
    const stretches = walkStretches(way, [food], (tried[0]?.entry.inBy ?? 0) - 300_000, frame.walks);
    const worst = stretches.toSorted((a, b) => b.chance - a.chance)[0];
    expect(worst?.worst).toBe(0);
    expect(worst?.from.eastM).toBeGreaterThan(100);
    expect(worst?.from.eastM).toBeLessThan(320);
    expect(stretches[0]?.chance).toBeLessThan((worst?.chance ?? 0) / 2);
  });
});
