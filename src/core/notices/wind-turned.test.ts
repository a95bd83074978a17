import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { judgeTurn, type Outlook } from './wind-turned';

const at = (quiet: number, hold: number | null): Outlook => ({ quiet, hold });

describe('a booked sit whose wind turns', () => {
  it('is worse from the points a member has set on', () => {
    expect(judgeTurn(at(80, 0.9), at(65.1, 0.9), 15)).toBe('same');
    expect(judgeTurn(at(80, 0.9), at(65, 0.9), 15)).toBe('worse');
    expect(judgeTurn(at(80, 0.9), at(65, 0.9), 20)).toBe('same');
  });

  it('is worse when it leaves its good winds, however little quiet falls', () => {
    expect(judgeTurn(at(70, 0.6), at(68, 0.49), 15)).toBe('worse');
    expect(judgeTurn(at(70, 0.5), at(68, 0.5), 15)).toBe('same');
    expect(judgeTurn(at(70, null), at(69, 0.2), 15)).toBe('worse');
  });

  it('was known to be bad when it was booked so: nothing is said', () => {
    expect(judgeTurn(at(40, 0.2), at(38, 0.1), 15)).toBe('same');
  });

  it('is better when it comes back', () => {
    expect(judgeTurn(at(40, 0.2), at(45, 0.8), 15)).toBe('better');
    expect(judgeTurn(at(40, 0.8), at(60, 0.8), 15)).toBe('better');
    expect(judgeTurn(at(40, 0.2), at(42, null), 15)).toBe('same');
  });

  it('is never both ways at once, and a lost forecast alone is no news', () => {
    const quiet = fc.double({ min: 0, max: 100, noNaN: true });
    const hold = fc.option(fc.double({ min: 0, max: 1, noNaN: true }), { nil: null });
    fc.assert(
      fc.property(quiet, hold, quiet, hold, (q1, h1, q2, h2) => {
        const [a, b] = [judgeTurn(at(q1, h1), at(q2, h2), 15), judgeTurn(at(q2, h2), at(q1, h1), 15)];
        if (a === 'better') expect(b).toBe('worse');
        expect(judgeTurn(at(q1, h1), at(q1, null), 15)).toBe('same');
        expect(judgeTurn(at(q1, h1), at(q1, h1), 15)).toBe('same');
      }),
    );
  });
});
