import { describe, expect, it } from 'vitest';
import { sunPosition } from '../sun';
import { isStabilityNight } from './night-rule';
import { nightSky, pasquillKey } from './pasquill-key';
import { classOfSigmaTheta, sigmaThetaDeg } from './sigma-theta';
import { srdtDay, srdtNight } from './srdt';
import { stabilityOf } from './stability';
import { STABILITY_CLASSES, stabilityIndex } from './stability-types';
import { insolationNumber, netRadiationIndex, turnerClass, turnerNumber } from './turner';

describe('Pasquill key (Pasquill 1961 as printed by NOAA Air Resources Laboratory)', () => {
  it.each([
    [1.5, nightSky(0), 'F', 'F'],
    [4, nightSky(2), 'E', 'E'],
    [2.5, nightSky(6), 'E', 'E'],
    [4, nightSky(6), 'D', 'D'],
    [1, 'day_strong', 'A', 'A'],
    [1, 'day_moderate', 'A', 'B'],
    [2, 'day_strong', 'A', 'B'],
    [4, 'day_moderate', 'B', 'C'],
    [5.5, 'day_moderate', 'C', 'D'],
    [7, 'day_slight', 'D', 'D'],
    [1, 'overcast', 'D', 'D'],
    [9, 'overcast', 'D', 'D'],
    [1, 'turn_of_day', 'D', 'D'],
  ] as const)('%s m/s, %s: %s-%s', (speed, sky, least, most) => {
    expect(pasquillKey(speed, sky)).toEqual([least, most]);
  });

  it('is D for overcast night', () => expect(nightSky(8)).toBe('overcast'));
});

describe("Turner's method (EPA-454/R-99-005 Tables 6-4 to 6-6)", () => {
  const TABLE: [number[], number[]][] = [
    [
      [0, 0.7],
      [1, 1, 2, 3, 4, 6, 7],
    ],
    [
      [0.8, 1.8],
      [1, 2, 2, 3, 4, 6, 7],
    ],
    [
      [1.9, 2.8],
      [1, 2, 3, 4, 4, 5, 6],
    ],
    [
      [2.9, 3.3],
      [2, 2, 3, 4, 4, 5, 6],
    ],
    [
      [3.4, 3.8],
      [2, 2, 3, 4, 4, 4, 5],
    ],
    [
      [3.9, 4.8],
      [2, 3, 3, 4, 4, 4, 5],
    ],
    [
      [4.9, 5.4],
      [3, 3, 4, 4, 4, 4, 5],
    ],
    [
      [5.5, 5.9],
      [3, 3, 4, 4, 4, 4, 4],
    ],
    [
      [6, 15],
      [3, 4, 4, 4, 4, 4, 4],
    ],
  ];
  it.each(TABLE)('holds every cell of the row %s m/s', (speeds, numbers) => {
    for (const speed of speeds) {
      expect(([4, 3, 2, 1, 0, -1, -2] as const).map((nri) => turnerNumber(speed, nri))).toEqual(numbers);
    }
  });

  it('merges 7 into F and is neutral at index 0', () => {
    expect(turnerClass(1, -2)).toBe('F');
    for (const speed of [0.3, 1, 2, 3, 4, 5, 6, 20]) expect(turnerClass(speed, 0)).toBe('D');
  });

  it.each([
    [61, 4],
    [60, 3],
    [36, 3],
    [35, 2],
    [16, 2],
    [15, 1],
    [3, 1],
  ])('insolation number at %s degrees is %s', (altitude, number) => expect(insolationNumber(altitude)).toBe(number));

  it.each([
    [{ isNight: true, sunAltitudeDeg: -20, cloudPercent: 40, ceilingFt: null }, -2],
    [{ isNight: true, sunAltitudeDeg: -20, cloudPercent: 50, ceilingFt: null }, -1],
    [{ isNight: true, sunAltitudeDeg: -20, cloudPercent: 100, ceilingFt: 3000 }, 0],
    [{ isNight: false, sunAltitudeDeg: 40, cloudPercent: 100, ceilingFt: 3000 }, 0],
    [{ isNight: false, sunAltitudeDeg: 40, cloudPercent: 50, ceilingFt: null }, 3],
    // The day's cloud corrections: values from memory of Turner's rules.
    [{ isNight: false, sunAltitudeDeg: 40, cloudPercent: 80, ceilingFt: 5000 }, 1],
    [{ isNight: false, sunAltitudeDeg: 40, cloudPercent: 80, ceilingFt: 9000 }, 2],
    [{ isNight: false, sunAltitudeDeg: 40, cloudPercent: 100, ceilingFt: 9000 }, 2],
    [{ isNight: false, sunAltitudeDeg: 40, cloudPercent: 80, ceilingFt: 20000 }, 3],
    [{ isNight: false, sunAltitudeDeg: 20, cloudPercent: 80, ceilingFt: 5000 }, 1],
  ])('net radiation index of %o is %s', (input, nri) => expect(netRadiationIndex(input)).toBe(nri));
});

describe('SRDT (EPA-454/R-99-005 Table 6-7)', () => {
  it.each([
    [1.9, 'A A B D'],
    [2, 'A B C D'],
    [4, 'B B C D'],
    [5.5, 'C C D D'],
    [6, 'C D D D'],
  ])('holds the day row at %s m/s', (speed, row) => {
    expect([925, 924, 300, 174].map((w) => srdtDay(speed, w)).join(' ')).toBe(row);
  });
  it('holds the printed points', () => {
    expect([srdtDay(1.9, 300), srdtDay(4, 700), srdtDay(5.5, 500), srdtNight(2.2, true)]).toEqual(['B', 'B', 'D', 'E']);
  });
  it('holds the night rows', () => {
    expect([1.9, 2.2, 2.5].map((u) => srdtNight(u, false))).toEqual(['E', 'D', 'D']);
    expect([1.9, 2.2, 2.5].map((u) => srdtNight(u, true))).toEqual(['F', 'E', 'D']);
  });
});

describe('night rule (EPA-454/R-99-005: an hour before sunset to an hour after sunrise)', () => {
  // Buford GA, 15 November 2016, US Naval Observatory one-year table: rise 07:09, set 17:32 EST.
  const rise = Date.UTC(2016, 10, 15, 12, 9);
  const set = Date.UTC(2016, 10, 15, 22, 32);
  const altitude = (at: number): number => sunPosition(at, 34.117, -84).altitudeDeg;
  const minutes = (from: number, n: number): boolean => isStabilityNight(from + n * 60_000, altitude);
  it('lasts an hour into the morning and begins an hour before the evening', () => {
    expect([minutes(rise, 30), minutes(rise, 56), minutes(rise, 64), minutes(rise, 90)]).toEqual([
      true,
      true,
      false,
      false,
    ]);
    expect([minutes(set, -64), minutes(set, -56), minutes(set, 30), minutes(rise, 300)]).toEqual([
      false,
      true,
      true,
      false,
    ]);
  });
  it('needs no sunrise in polar day and night', () => {
    expect(isStabilityNight(Date.UTC(2024, 5, 21, 0), (at) => sunPosition(at, 78, 15).altitudeDeg)).toBe(false);
    expect(isStabilityNight(Date.UTC(2024, 11, 21, 11), (at) => sunPosition(at, 78, 15).altitudeDeg)).toBe(true);
  });
  it('gives D or a day class 90 minutes after sunrise and a night class 30 minutes after', () => {
    const at = (n: number) => ({
      isNight: minutes(rise, n),
      sunAltitudeDeg: altitude(rise + n * 60_000),
      speedMps: 2,
      cloudPercent: 0,
      radiationWm2: null,
    });
    expect(stabilityIndex(stabilityOf(at(30)))).toBeGreaterThan(3);
    expect(stabilityIndex(stabilityOf(at(90)))).toBeLessThanOrEqual(3);
  });
});

describe('choice of method', () => {
  const noon = { isNight: false, sunAltitudeDeg: 37, speedMps: 2.5, cloudPercent: 0 };
  it('uses radiation by day, cloud without it, and never radiation by night', () => {
    expect(stabilityOf({ ...noon, radiationWm2: 100 })).toBe('D');
    expect(stabilityOf({ ...noon, radiationWm2: null })).toBe('B');
    expect(stabilityOf({ ...noon, isNight: true, radiationWm2: 900 })).toBe('F');
  });
  it('agrees with the Pasquill key within one class over autumn skies (the two methods differ by design)', () => {
    for (const speedMps of [0.5, 1.5, 2.5, 4, 5.5, 8]) {
      for (const [sky, input] of [
        ['day_slight', { ...noon, sunAltitudeDeg: 20 }],
        ['day_moderate', { ...noon, sunAltitudeDeg: 50 }],
        ['night_clear', { ...noon, isNight: true, sunAltitudeDeg: -20 }],
        ['night_cloudy', { ...noon, isNight: true, sunAltitudeDeg: -20, cloudPercent: 70 }],
      ] as const) {
        const [least, most] = pasquillKey(speedMps, sky).map(stabilityIndex) as [number, number];
        const turner = stabilityIndex(stabilityOf({ ...input, speedMps, radiationWm2: null }));
        expect(turner).toBeGreaterThanOrEqual(least - 1);
        expect(turner).toBeLessThanOrEqual(most + 1);
      }
    }
  });
});

describe('sigma-theta (NOAA READY after NRC Guide 1.23; bounds EPA Table 6-9a, values from memory)', () => {
  it('falls from A to F as printed', () => {
    expect(STABILITY_CLASSES.map(sigmaThetaDeg)).toEqual([25, 20, 15, 10, 5, 2.5]);
  });
  it('is binned by lower bounds', () => {
    expect([23, 21, 13, 9, 4, 3].map(classOfSigmaTheta)).toEqual(['A', 'B', 'C', 'D', 'E', 'F']);
  });
});
