import { describe, expect, it } from 'vitest';
import { type DrawnLine, movementOverlay } from './overlay-of';

const LINE: DrawnLine = {
  id: 'f',
  name: 'Long line',
  morning: 1,
  legs: [
    {
      number: 4,
      key: 'a',
      from: 'Clover',
      to: 'Beds',
      length: '100 yd',
      path: [
        [0, 0],
        [1, 0],
      ],
      stands: [{ id: 's', name: 'Oak', when: 'mornings on N', at: [0.5, 1], aim: [0.5, 0] }],
    },
  ],
  gaps: [
    {
      text: '60 yd',
      path: [
        [0.6, 0],
        [1, 0],
      ],
    },
  ],
};
const ways = (line: DrawnLine) =>
  (['morning', 'evening'] as const).map((window) => movementOverlay([line], window).legs?.map(({ way }) => way));

describe('lines of movement over a map', () => {
  it('turn with the window', () => {
    expect(ways(LINE)).toEqual([[1], [-1]]);
    expect(ways({ ...LINE, morning: -1 })).toEqual([[-1], [1]]);
    expect(ways({ ...LINE, morning: null })).toEqual([[null], [null]]);
  });

  it('say the same as the list: numbers, who reaches a leg, and gaps', () => {
    const { legs, gaps, reaches } = movementOverlay([LINE], 'morning');
    expect(legs?.map(({ name, served }) => [name, served])).toEqual([['4', true]]);
    expect(gaps).toEqual([LINE.gaps[0]?.path]);
    expect(reaches).toEqual([{ from: [0.5, 1], to: [0.5, 0] }]);
    const bare = { ...LINE, legs: LINE.legs.map((leg) => ({ ...leg, stands: [] })) };
    expect(movementOverlay([bare], 'morning').legs?.[0]?.served).toBe(false);
  });
});
