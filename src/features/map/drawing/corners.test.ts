import { describe, expect, it } from 'vitest';
import { touchedCorner, withoutCorner } from './corners';

const line = {
  type: 'LineString' as const,
  coordinates: [
    [0, 0],
    [1, 0],
    [2, 0],
  ],
};
const ring = [
  [0, 0],
  [4, 0],
  [4, 4],
  [0, 4],
  [0, 0],
];
const hole = [
  [1, 1],
  [1, 2],
  [2, 2],
  [1, 1],
];
const area = { type: 'Polygon' as const, coordinates: [ring, hole] };

describe('corners', () => {
  it('knows the one that was moved or set in, and none when all were', () => {
    expect(
      touchedCorner(line, {
        ...line,
        coordinates: [
          [0, 0],
          [1, 1],
          [2, 0],
        ],
      }),
    ).toEqual([1, 1]);
    expect(
      touchedCorner(line, {
        ...line,
        coordinates: [
          [0, 0],
          [0.5, 0],
          [1, 0],
          [2, 0],
        ],
      }),
    ).toEqual([0.5, 0]);
    expect(
      touchedCorner(line, {
        ...line,
        coordinates: [
          [5, 0],
          [6, 0],
          [7, 0],
        ],
      }),
    ).toBeNull();
    expect(touchedCorner(area, { ...area, coordinates: [[[9, 9], ...ring.slice(1, -1), [9, 9]], hole] })).toEqual([
      9, 9,
    ]);
  });

  it('takes one out, keeps rings closed and holes, and stops before nothing is left', () => {
    expect(withoutCorner(line, [1, 0])).toEqual({
      type: 'LineString',
      coordinates: [
        [0, 0],
        [2, 0],
      ],
    });
    expect(withoutCorner(area, [0, 0])).toEqual({
      type: 'Polygon',
      coordinates: [
        [
          [4, 0],
          [4, 4],
          [0, 4],
          [4, 0],
        ],
        hole,
      ],
    });
    expect(withoutCorner({ ...line, coordinates: line.coordinates.slice(0, 2) }, [1, 0])).toBeNull();
    expect(withoutCorner({ type: 'Point', coordinates: [0, 0] }, [0, 0])).toBeNull();
  });
});
