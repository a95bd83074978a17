import { describe, expect, it } from 'vitest';
import { fromLocal } from '@/core/geometry';
import { ydToM } from '@/core/units';
import { type SketchInput, sketchGround } from './sketch-ground';

const centre = { lat: 34.117, lon: -84 };
const at = (eastM: number, northM: number) => fromLocal(centre, { eastM, northM });
const position = (eastM: number, northM: number) => {
  const { lat, lon } = at(eastM, northM);
  return [lon, lat];
};
const EMPTY: SketchInput = { centre, units: 'us', stands: [], parkings: [], lines: [] };

describe('the sketch of a ground', () => {
  it('has north up and east right, and keeps distances alike both ways', () => {
    const sketch = sketchGround({
      ...EMPTY,
      stands: [
        { id: 'middle', ...at(0, 0) },
        { id: 'north', ...at(0, 400) },
        { id: 'east', ...at(400, 0) },
      ],
    });
    const [middle, north, east] = sketch?.stands ?? [];
    if (!sketch || !middle || !north || !east) throw new Error('no sketch');
    expect(north.x).toBeCloseTo(middle.x, 0);
    expect(middle.y - north.y).toBeCloseTo(east.x - middle.x, 0);
    expect(middle.y - north.y).toBeGreaterThan(100);
    for (const { x, y } of sketch.stands) {
      expect(x).toBeGreaterThan(0);
      expect(x).toBeLessThan(sketch.width);
      expect(y).toBeGreaterThan(0);
      expect(y).toBeLessThan(sketch.height);
    }
  });

  it('draws a scale bar as long as it says', () => {
    const sketch = sketchGround({
      ...EMPTY,
      stands: [
        { id: 'a', ...at(0, 0) },
        { id: 'b', ...at(1000, 0) },
      ],
    });
    const [a, b] = sketch?.stands ?? [];
    const yards = Number(sketch?.scale?.label.replace(/ yd$/, ''));
    expect(yards).toBeGreaterThan(0);
    const perMetre = ((b?.x ?? 0) - (a?.x ?? 0)) / 1000;
    expect(sketch?.scale?.length).toBeCloseTo(ydToM(yards) * perMetre, 0);
  });

  it('closes a boundary, leaves a way open, and is nothing where nothing is known', () => {
    const square = [position(0, 0), position(500, 0), position(500, 500), position(0, 0)];
    const sketch = sketchGround({
      ...EMPTY,
      lines: [
        { kind: 'boundary', points: square, closed: true },
        { kind: 'way', points: square.slice(0, 2), closed: false },
      ],
    });
    expect(sketch?.lines.map(({ kind, path }) => [kind, path.endsWith('Z')])).toEqual([
      ['boundary', true],
      ['way', false],
    ]);
    expect(sketchGround(EMPTY)).toBeNull();
  });

  it('gives a lone stand a place and a scale', () => {
    const sketch = sketchGround({ ...EMPTY, stands: [{ id: 'a', ...at(10, 10) }] });
    expect(sketch?.stands).toHaveLength(1);
    expect(sketch?.scale).not.toBeNull();
  });
});
