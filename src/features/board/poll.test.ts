import { expect, it } from 'vitest';
import { pollAfterMs } from './poll';

it('asks every quarter minute, and ever more seldom while nothing answers', () => {
  expect(pollAfterMs({ failing: false, lastAnswerAt: 0, now: 9e9 })).toBe(15_000);
  const waits: number[] = [];
  let now = 15_000;
  for (let tries = 0; tries < 8; tries++) {
    const wait = pollAfterMs({ failing: true, lastAnswerAt: 0, now });
    waits.push(wait / 1000);
    now += wait;
  }
  expect(waits).toEqual([15, 30, 60, 120, 240, 300, 300, 300]);
});
