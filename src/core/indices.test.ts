import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { figureText, indicesBy, indicesOf, intervalText, type SitCount } from './indices';

const sit = (hours: number, bucks: number, does: number, fawns: number, unknown: number, bumped = 0): SitCount => ({
  hours,
  bucks,
  does,
  fawns,
  unknown,
  bumped,
});

/** Six sits made up and worked by hand; the fourth saw nothing. */
const SIX = [
  sit(3.5, 0, 2, 1, 0),
  sit(2, 1, 0, 0, 1),
  sit(4, 1, 4, 3, 0, 2),
  sit(3, 0, 0, 0, 0),
  sit(2.5, 2, 3, 2, 1),
  sit(5, 1, 6, 4, 2),
];

describe('indices of the worked example', () => {
  const found = indicesOf(SIX);

  it('sums hours and deer, the sit without any too', () => {
    expect(found).toMatchObject({ sits: 6, zeroSits: 1, hours: 20 });
    expect(found.seen).toEqual({ all: 34, bucks: 5, does: 15, fawns: 10, unknown: 4 });
  });

  it('gives sums over sums: 1.70 deer and 0.25 bucks an hour', () => {
    expect(figureText(found.perHour.all)).toBe('1.70');
    expect(figureText(found.perHour.bucks)).toBe('0.25');
    const meanOfRates = SIX.reduce((sum, s) => sum + (s.bucks + s.does + s.fawns + s.unknown) / s.hours, 0) / 6;
    expect(meanOfRates.toFixed(2)).toBe('1.61');
  });

  it('gives 3.0 does per buck, 0.67 fawns per doe, 11.8 % unknown', () => {
    expect(found.doesPerBuck).toMatchObject({ known: true, value: 3 });
    expect(figureText(found.fawnsPerDoe)).toBe('0.67');
    expect(figureText(found.unknownShare, 'percent')).toBe('11.8 %');
  });

  it('counts sits with a bump', () => {
    expect(found.bumpedSits).toBe(1);
    expect(figureText(found.bumpedShare, 'percent')).toBe('16.7 %');
  });

  it('puts an interval beside each', () => {
    // Exact limits of a count of 5, 1.623 and 11.668 (Garwood 1936), over 20 hours.
    expect(intervalText(found.perHour.bucks)).toBe('0.08 to 0.58');
    // Wilson 1927, 1 of 6 worked by hand: 0.0301 to 0.5635.
    expect(intervalText(found.bumpedShare, 'percent')).toBe('3 to 56 %');
  });
});

it('comes out near a published effort: 487 hunts of 3.7 h with 2.7 deer each give 0.73 an hour (Meier et al. 2025)', () => {
  const hunts = Array.from({ length: 487 }, (_, n) => sit(3.7, 0, n % 10 < 7 ? 3 : 2, 0, 0));
  expect(figureText(indicesOf(hunts).perHour.all)).toBe('0.73');
});

describe('what cannot be said', () => {
  it('has no rate without hours', () => {
    expect(figureText(indicesOf([]).perHour.all)).toBe('no hours sat');
    expect(figureText(indicesOf([sit(0, 1, 0, 0, 0)]).perHour.bucks)).toBe('no hours sat');
    expect(intervalText(indicesOf([]).perHour.all)).toBe('');
  });

  it('says that no bucks, does or deer were seen', () => {
    const { doesPerBuck, fawnsPerDoe, unknownShare, perHour } = indicesOf([sit(3, 0, 4, 0, 0)]);
    expect(figureText(doesPerBuck)).toBe('no bucks seen');
    expect(figureText(fawnsPerDoe)).toBe('0.00');
    expect(figureText(unknownShare, 'percent')).toBe('0.0 %');
    expect(figureText(indicesOf([sit(3, 1, 0, 2, 0)]).fawnsPerDoe)).toBe('no does seen');
    expect(figureText(indicesOf([sit(3, 0, 0, 0, 0)]).unknownShare, 'percent')).toBe('no deer seen');
    // Nothing in three hours is still a rate: at most 3.689 / 3 an hour (Garwood 1936).
    expect(perHour.bucks).toMatchObject({ known: true, value: 0, low: 0 });
    expect(intervalText(perHour.bucks)).toBe('0.00 to 1.23');
  });
});

describe('indicesBy', () => {
  it('splits sits into groups that add up to the whole', () => {
    const count = fc.nat(20);
    const some = fc.record({
      hours: fc.integer({ min: 0, max: 24 }).map((q) => q / 4),
      bucks: count,
      does: count,
      fawns: count,
      unknown: count,
      bumped: fc.nat(2),
      at: fc.constantFrom('a', 'b', 'c'),
    });
    fc.assert(
      fc.property(fc.array(some), (sits) => {
        const whole = indicesOf(sits);
        const parts = [...indicesBy(sits, (s) => s.at).values()];
        const sum = (pick: (part: (typeof parts)[number]) => number) => parts.reduce((n, part) => n + pick(part), 0);
        expect(sum((p) => p.sits)).toBe(whole.sits);
        expect(sum((p) => p.seen.all)).toBe(whole.seen.all);
        expect(sum((p) => p.bumpedSits)).toBe(whole.bumpedSits);
        expect(sum((p) => p.hours)).toBeCloseTo(whole.hours, 9);
      }),
    );
  });
});
