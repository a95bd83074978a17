import { existsSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parseReplayCsv } from './replay-csv';

const HEADING = 'time_utc,wind_from_deg,wind_speed_mph,wind_gust_mph,temp_f,pressure_hpa,precip_in';
const csv = (...rows: string[]) => [HEADING, ...rows].join('\n');

describe('parseReplayCsv', () => {
  it('reads a row into SI (exact factors of the international mile, inch and Fahrenheit scale)', () => {
    const { hours, problems } = parseReplayCsv(csv('2013-11-09T11:00:00Z,310,10,20,50,1020.5,0.1'));
    expect(problems).toEqual([]);
    const hour = hours[0];
    expect(hour?.at).toBe(Date.UTC(2013, 10, 9, 11));
    expect(hour?.windFromDeg).toBe(310);
    expect(hour?.windSpeedMps).toBeCloseTo(4.4704, 10);
    expect(hour?.gustMps).toBeCloseTo(8.9408, 10);
    expect(hour?.tempC).toBeCloseTo(10, 10);
    expect(hour?.pressureHpa).toBe(1020.5);
    expect(hour?.precipMm).toBeCloseTo(2.54, 10);
    expect(hour?.cloudPercent).toBeNull();
    expect(hour?.radiationWm2).toBeNull();
  });

  it('tells calm, variable, north and not given apart', () => {
    const { hours } = parseReplayCsv(
      csv(
        '2013-11-09T00:00:00Z,0,0.0,,50,,0',
        '2013-11-09T01:00:00Z,,4.6,,50,,0',
        '2013-11-09T02:00:00Z,360,4.6,,50,,0',
        '2013-11-09T03:00:00Z,,,,,,',
        '2013-11-09T04:00:00Z,0,4.6,,50,,0',
      ),
    );
    expect(hours.map((hour) => hour.windFromDeg)).toEqual([null, null, 0, null, 0]);
    expect(hours.map((hour) => hour.windSpeedMps === null)).toEqual([false, false, false, true, false]);
    expect(hours[0]?.windSpeedMps).toBe(0);
    expect(hours[1]?.windSpeedMps).toBeGreaterThan(0);
  });

  it('leaves a gap a gap and puts hours in order of time', () => {
    const { hours } = parseReplayCsv(csv('2013-11-09T05:00:00Z,310,10,,50,,0', '2013-11-09T01:00:00Z,310,10,,50,,0'));
    expect(hours.map((hour) => new Date(hour.at).getUTCHours())).toEqual([1, 5]);
  });

  it.each([
    ['a direction past the circle', '2013-11-09T01:00:00Z,361,10,,50,,0', 'wind_from_deg "361"'],
    ['a word for a number', '2013-11-09T01:00:00Z,NW,10,,50,,0', 'wind_from_deg "NW"'],
    ['a speed below zero', '2013-11-09T01:00:00Z,310,-1,,50,,0', 'wind_speed_mph "-1"'],
    ['a cell too few', '2013-11-09T01:00:00Z,310,10,,50,', 'Has 6 cells'],
    ['a local time', '2013-11-09T01:00:00,310,10,,50,,0', 'time_utc'],
    ['a day that does not exist', '2013-02-30T01:00:00Z,310,10,,50,,0', 'time_utc'],
    ['infinity', '2013-11-09T01:00:00Z,310,10,,Infinity,,0', 'temp_f'],
    ['a time given twice', '2013-11-09T00:00:00Z,180,9,,50,,0', 'line 2'],
  ])('names the line of %s and keeps the rest', (_, bad, says) => {
    const good = '2013-11-09T00:00:00Z,310,10,,50,,0';
    const { hours, problems } = parseReplayCsv(csv(good, '', bad, '2013-11-09T02:00:00Z,320,10,,50,,0'));
    expect(hours).toHaveLength(2);
    expect(problems).toHaveLength(1);
    expect(problems[0]?.line).toBe(4);
    expect(problems[0]?.message).toContain(says);
  });

  it('accepts carriage returns, a byte order mark, quotes and columns in another order', () => {
    const text = '\uFEFFwind_speed_mph,time_utc,wind_from_deg\r\n"10","2013-11-09T11:00:00Z","310"\r\n';
    const { hours, problems } = parseReplayCsv(text);
    expect(problems).toEqual([]);
    expect(hours[0]?.windFromDeg).toBe(310);
    expect(hours[0]?.tempC).toBeNull();
  });

  it('says which column the heading lacks', () => {
    expect(parseReplayCsv('time_utc,wind_speed_mph\n2013-11-09T11:00:00Z,10').problems[0]?.message).toContain(
      'wind_from_deg',
    );
    expect(parseReplayCsv('').hours).toEqual([]);
  });
});

const realHours = process.env.REAL_HOURS ?? '../shared/data/hourly-observations-KEWR-2013-autumn.csv';

describe.skipIf(!existsSync(realHours))('real hours of an airport, autumn 2013', () => {
  it('reads every row', () => {
    const { hours, problems } = parseReplayCsv(readFileSync(realHours, 'utf8'));
    expect(problems).toEqual([]);
    expect(hours).toHaveLength(2884);
    // Counted in the file with awk: empty direction; direction 0 and speed 0; empty pressure.
    const calm = hours.filter((hour) => hour.windSpeedMps === 0);
    const variable = hours.filter((hour) => hour.windFromDeg === null && hour.windSpeedMps !== 0);
    expect(calm).toHaveLength(216);
    expect(variable).toHaveLength(70);
    expect(hours.filter((hour) => hour.pressureHpa === null)).toHaveLength(281);
    expect(new Date(hours[0]?.at ?? 0).toISOString()).toBe('2013-09-01T04:00:00.000Z');
    expect(new Date(hours.at(-1)?.at ?? 0).toISOString()).toBe('2013-12-30T23:00:00.000Z');
    const steps = hours.slice(1).map((hour, index) => hour.at - (hours[index]?.at ?? 0));
    expect(Math.min(...steps)).toBe(3_600_000);
    expect(Math.max(...steps)).toBeGreaterThan(3_600_000);
  });
});
