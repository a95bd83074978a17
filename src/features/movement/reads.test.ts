import { describe, expect, it } from 'vitest';
import { windSpans } from './reads';

describe('winds as spans of compass points', () => {
  it('joins points side by side, across north too', () => {
    expect(windSpans([0, 1, 2, 14, 15])).toBe('NW-NE');
    expect(windSpans([8])).toBe('S');
    expect(windSpans([4, 5, 12])).toBe('E-ESE, W');
    expect(windSpans(Array.from({ length: 16 }, (_, i) => i))).toBe('any wind');
    expect(windSpans([])).toBe('');
  });
});
