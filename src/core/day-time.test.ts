import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addDays,
  dayOf,
  dayOfYear,
  daysBetween,
  formatClock,
  formatClock12,
  formatDay,
  formatMonth,
  isClock,
  isDay,
  isZone,
  localToUtc,
  monthOf,
  roundToMinute,
} from './day-time';

const NY = 'America/New_York';
const iso = (at: number) => new Date(at).toISOString();
const dayGen = fc.integer({ min: 0, max: 30000 }).map((n) => addDays('1990-01-01', n));

describe('days', () => {
  it('are days of the calendar only', () => {
    for (const day of ['2024-02-29', '2023-12-31']) expect(isDay(day)).toBe(true);
    for (const day of ['2023-02-29', '2024-13-01', '2024-1-1', '', 'tomorrow', '2024-00-10'])
      expect(isDay(day)).toBe(false);
    expect(() => addDays('2023-02-29', 1)).toThrow(RangeError);
  });

  it('add and subtract over months, leap days and clock changes', () => {
    expect(addDays('2024-02-28', 1)).toBe('2024-02-29');
    expect(addDays('2016-11-05', 2)).toBe('2016-11-07');
    expect(addDays('2026-01-01', -1)).toBe('2025-12-31');
    expect(daysBetween('2016-03-12', '2016-03-14')).toBe(2);
    fc.assert(
      fc.property(dayGen, fc.integer({ min: -500, max: 500 }), (day, n) => {
        expect(daysBetween(day, addDays(day, n))).toBe(n);
      }),
    );
  });

  it('read well', () => {
    // 7 November 2026 is a Saturday.
    expect(formatDay('2026-11-07')).toBe('Sat 7 Nov');
    expect(formatDay('2026-11-07', true)).toBe('Sat 7 Nov 2026');
    expect(monthOf('2026-11-07')).toBe(11);
    expect(formatMonth('2026-11-07')).toBe('Nov');
    expect(dayOfYear('2024-12-31')).toBe(366);
  });
});

describe('club clocks', () => {
  it('move a time that is skipped on by what was skipped', () => {
    // US clocks went forward at 02:00 on 13 March 2016; Lord Howe moves by half an hour.
    expect(iso(localToUtc('2016-03-13', '02:30', NY))).toBe('2016-03-13T07:30:00.000Z');
    expect(formatClock(localToUtc('2016-03-13', '02:30', NY), NY)).toBe('03:30');
    expect(formatClock(localToUtc('2024-10-06', '02:15', 'Australia/Lord_Howe'), 'Australia/Lord_Howe')).toBe('02:45');
  });

  it('take the first of a time that comes twice', () => {
    expect(iso(localToUtc('2016-11-06', '01:30', NY))).toBe('2016-11-06T05:30:00.000Z');
    expect(iso(localToUtc('2016-11-06', '02:00', NY))).toBe('2016-11-06T07:00:00.000Z');
  });

  it('keep the true length of a span over a change', () => {
    const hours = (day: string) => (localToUtc(day, '04:30', NY) - localToUtc(day, '00:30', NY)) / 3_600_000;
    expect(hours('2016-03-12')).toBe(4);
    expect(hours('2016-03-13')).toBe(3);
    expect(hours('2016-11-06')).toBe(5);
  });

  it('give back the day and the clock outside skipped hours, in any zone', () => {
    const zones = [
      NY,
      'America/Chicago',
      'America/Phoenix',
      'America/St_Johns',
      'Europe/London',
      'Asia/Kathmandu',
      'UTC',
      'Pacific/Kiritimati',
    ];
    fc.assert(
      fc.property(dayGen, fc.integer({ min: 240, max: 1380 }), fc.constantFrom(...zones), (day, minute, zone) => {
        const clock = `${String(Math.floor(minute / 60)).padStart(2, '0')}:${String(minute % 60).padStart(2, '0')}`;
        const at = localToUtc(day, clock, zone);
        expect([dayOf(at, zone), formatClock(at, zone)]).toEqual([day, clock]);
      }),
    );
  });

  it('show both kinds of clock', () => {
    const at = Date.parse('2026-11-07T05:05:00Z');
    expect([formatClock(at, NY), formatClock12(at, NY)]).toEqual(['00:05', '12:05 AM']);
    expect(formatClock12(at + 12 * 3_600_000, NY)).toBe('12:05 PM');
    expect(dayOf(Date.parse('2026-11-07T04:59:00Z'), NY)).toBe('2026-11-06');
  });

  it('refuse nonsense', () => {
    expect(isClock('23:59')).toBe(true);
    for (const clock of ['24:00', '7:00', '12:60', '']) expect(isClock(clock)).toBe(false);
    expect(isZone(NY)).toBe(true);
    expect(isZone('Mars/Olympus')).toBe(false);
    expect(() => localToUtc('2026-11-07', '25:00', NY)).toThrow(RangeError);
    expect(() => dayOf(0, 'Mars/Olympus')).toThrow(RangeError);
  });

  it('round to the minute with halves up', () => {
    expect(roundToMinute(30_000)).toBe(60_000);
    expect(roundToMinute(29_999)).toBe(0);
  });
});
