import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DEFAULT_CLUB_RULES } from './booking/rules';
import { addDays, dayOf, formatClock, localToUtc } from './day-time';
import { allDayWindows, nextWindow, sitWindow, windowsFrom } from './windows';

const RULES = DEFAULT_CLUB_RULES;
const BUFORD = { lat: 34 + 7 / 60, lon: -84, zone: 'America/New_York' };
const clocks = (day: string, window: 'morning' | 'evening', place = BUFORD) => {
  const w = sitWindow(day, window, RULES, place);
  return [formatClock(w.startAt, place.zone), formatClock(w.endAt, place.zone)];
};

describe('sitWindow', () => {
  it('runs from before sunrise to the clock, and from the clock to after sunset, over clock changes', () => {
    // USNO, Buford GA 2016: rise 08:00 EDT and set 18:39 EDT on 5 November, 07:01 and 17:38 EST on the 6th.
    expect(clocks('2016-11-05', 'morning')).toEqual(['07:30', '11:00']);
    expect(clocks('2016-11-05', 'evening')).toEqual(['14:30', '19:09']);
    expect(clocks('2016-11-06', 'morning')).toEqual(['06:31', '11:00']);
    expect(clocks('2016-11-06', 'evening')).toEqual(['14:30', '18:08']);
  });

  it('falls back to 06:00 and 20:00 where the sun does not rise or set', () => {
    const north = { lat: 71.29, lon: -156.79, zone: 'America/Anchorage' };
    expect(clocks('2023-06-21', 'morning', north)).toEqual(['05:30', '11:00']);
    expect(clocks('2023-06-21', 'evening', north)).toEqual(['14:30', '20:30']);
  });

  it('always has an hour or more, on any day at any latitude', () => {
    const day = fc.integer({ min: 0, max: 730 }).map((n) => addDays('2025-01-01', n));
    fc.assert(
      fc.property(day, fc.double({ min: -89, max: 89, noNaN: true }), (d, lat) => {
        for (const w of allDayWindows(d, RULES, { ...BUFORD, lat })) {
          expect(w.endAt - w.startAt).toBeGreaterThanOrEqual(3_600_000);
        }
      }),
    );
  });
});

describe('nextWindow', () => {
  const at = (clock: string) => nextWindow(localToUtc('2016-11-15', clock, BUFORD.zone), RULES, BUFORD);

  it('is the one going on or the next to begin', () => {
    expect(at('00:10')).toMatchObject({ day: '2016-11-15', window: 'morning' });
    expect(at('10:59')).toMatchObject({ day: '2016-11-15', window: 'morning' });
    expect(at('11:00')).toMatchObject({ day: '2016-11-15', window: 'evening' });
    expect(at('18:00')).toMatchObject({ day: '2016-11-15', window: 'evening' });
    expect(at('18:30')).toMatchObject({ day: '2016-11-16', window: 'morning' });
  });

  it('never has ended and leaves no window out', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 366 * 1440 }), (minute) => {
        const now = Date.UTC(2026, 0, 1) + minute * 60_000;
        const next = nextWindow(now, RULES, BUFORD);
        expect(next.endAt).toBeGreaterThan(now);
        const earlier = allDayWindows(dayOf(now, BUFORD.zone), RULES, BUFORD).filter((w) => w.startAt < next.startAt);
        expect(earlier.every((w) => w.endAt <= now)).toBe(true);
      }),
    );
  });

  it('is followed by the windows after it in order', () => {
    const list = windowsFrom(at('12:00'), 4, RULES, BUFORD).map((w) => `${w.day} ${w.window}`);
    expect(list).toEqual(['2016-11-15 evening', '2016-11-16 morning', '2016-11-16 evening', '2016-11-17 morning']);
  });
});
