import { expect, it } from 'vitest';
import { findCurrent } from './current-path';

const hrefs = ['/clubs/oak', '/clubs/oak/stands', '/clubs/oak/stand'];

it('takes the longest address that holds the path, by whole steps', () => {
  expect(findCurrent('/clubs/oak', hrefs)).toBe('/clubs/oak');
  expect(findCurrent('/clubs/oak/stands/std_1', hrefs)).toBe('/clubs/oak/stands');
  expect(findCurrent('/clubs/oak/week', hrefs)).toBe('/clubs/oak');
  expect(findCurrent('/clubs/oakley', hrefs)).toBeNull();
});
