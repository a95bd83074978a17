import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatClock, localToUtc } from '../day-time';
import { afterQuiet, isQuiet } from './quiet-hours';

const ZONE = 'America/New_York';
const night = { quietFrom: '21:30', quietTo: '05:00' };
const held = (clock: string, quiet = night, day = '2026-11-07') =>
  new Date(afterQuiet(localToUtc(day, clock, ZONE), quiet, ZONE)).toISOString();

describe('quiet hours', () => {
  it('hold over midnight until they end, and let everything else through at once', () => {
    expect(held('21:29')).toBe('2026-11-08T02:29:00.000Z');
    expect(held('21:30')).toBe('2026-11-08T10:00:00.000Z');
    expect(held('23:59')).toBe('2026-11-08T10:00:00.000Z');
    expect(held('04:59')).toBe('2026-11-07T10:00:00.000Z');
    expect(held('05:00')).toBe('2026-11-07T10:00:00.000Z');
  });

  it('may lie inside one day', () => {
    const noon = { quietFrom: '12:00', quietTo: '13:30' };
    expect(held('12:10', noon)).toBe('2026-11-07T18:30:00.000Z');
    expect(held('13:30', noon)).toBe('2026-11-07T18:30:00.000Z');
    expect(held('11:59', noon)).toBe('2026-11-07T16:59:00.000Z');
  });

  it('are none where both ends are the same', () => {
    expect(isQuiet('08:00', { quietFrom: '08:00', quietTo: '08:00' })).toBe(false);
  });

  it('end by the clock on the wall when clocks go back', () => {
    // 1 November 2026, 2 a.m. EDT becomes 1 a.m. EST (IANA tz database).
    expect(held('22:00', night, '2026-10-31')).toBe('2026-11-01T10:00:00.000Z');
  });

  it('never give an instant in the past or in the quiet hours', () => {
    const clock = fc
      .integer({ min: 0, max: 47 })
      .map((n) => `${String(n >> 1).padStart(2, '0')}:${n & 1 ? '30' : '00'}`);
    const at = fc.integer({ min: Date.UTC(2026, 0, 1), max: Date.UTC(2027, 0, 1) });
    fc.assert(
      fc.property(at, clock, clock, (now, quietFrom, quietTo) => {
        const then = afterQuiet(now, { quietFrom, quietTo }, ZONE);
        expect(then).toBeGreaterThanOrEqual(now);
        // A quiet end skipped or shown twice by a change of clocks may be off by that hour.
        if (![2, 10].includes(new Date(then).getUTCMonth())) {
          expect(isQuiet(formatClock(then, ZONE), { quietFrom, quietTo })).toBe(false);
        }
      }),
    );
  });
});
