import { describe, expect, it } from 'vitest';
import { at } from '../../../tests/helpers/small-ground';
import { stretchOf } from './stretch';

/** 100 m east, then 100 m north. */
const CORNER = [at(0, 0), at(100, 0), at(100, 100)];

describe('a stretch of a line', () => {
  it('keeps the corners between its ends', () => {
    expect(stretchOf(CORNER, 40, 130)).toEqual([at(40, 0), at(100, 0), at(100, 30)]);
    expect(stretchOf(CORNER, 10, 20)).toEqual([at(10, 0), at(20, 0)]);
    expect(stretchOf(CORNER, 0, 200)).toEqual(CORNER);
  });

  it('ends where the line does, and a point twice in it changes nothing', () => {
    expect(stretchOf(CORNER, 150, 900)).toEqual([at(100, 50), at(100, 100)]);
    expect(stretchOf([at(0, 0), at(0, 0), at(10, 0)], 0, 10)).toEqual([at(0, 0), at(10, 0)]);
    expect(stretchOf(CORNER, 50, 50)).toEqual([at(50, 0)]);
  });
});
