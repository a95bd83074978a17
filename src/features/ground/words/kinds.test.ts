import { expect, it } from 'vitest';
import { formatMonths } from './kinds';

it('writes months as runs, across the new year too', () => {
  expect(formatMonths([9, 10, 11, 12, 1])).toBe('Sep–Jan');
  expect(formatMonths([3, 11, 10])).toBe('Mar, Oct–Nov');
  expect(formatMonths([1, 12])).toBe('Dec–Jan');
  expect(formatMonths([7])).toBe('Jul');
  expect(formatMonths(Array.from({ length: 12 }, (_, i) => i + 1))).toBe('All year');
});
