import { describe, expect, it } from 'vitest';
import type { PressureEvent, PressureKind } from './condition-types';
import {
  DEFAULT_PRESSURE,
  marginalCost,
  nearEvents,
  pressureAfterDays,
  pressureLeft,
  pressureOnPromise,
  pressureOnQuiet,
} from './pressure';

const DAY = 86_400_000;
const s = DEFAULT_PRESSURE;
const here = { eastM: 0, northM: 0 };
const event = (at: number, kind: PressureKind = 'sit', eastM = 0): PressureEvent => ({
  at,
  kind,
  place: { eastM, northM: 0 },
  standId: null,
  bumped: 0,
});
const left = (events: PressureEvent[], at: number) => pressureLeft(nearEvents(here, events, s), at, s);
const cut = (pressure: number, day = 1, twilight = 0) => 1 - pressureOnPromise(pressure, day, twilight, s);

describe('pressure against studies of hunted deer', () => {
  it('leaves a quarter of a sit after three days (half-life of 1.5 days, design)', () => {
    expect(pressureAfterDays('sit', 0, 3, s)).toBeCloseTo(0.25, 10);
  });

  it('is near nothing by day four to five after one sit (a Sunday’s shift lasted to Wednesday: Wiskirchen et al. 2022)', () => {
    expect(cut(left([event(0)], 4.5 * DAY))).toBeLessThan(0.03);
    expect(cut(left([event(0)], 1 * DAY))).toBeGreaterThan(0.06);
  });

  it('takes 17 to 31 % by day after a heavy weekend, and never a third or more (Wiskirchen et al. 2022)', () => {
    const weekend = [0, 0.3, 0.5, 1, 1.3, 1.5].map((d) => event(d * DAY));
    const onSunday = cut(left(weekend, 1.6 * DAY));
    expect(onSunday).toBeGreaterThanOrEqual(0.17);
    expect(onSunday).toBeLessThanOrEqual(0.31);
    expect(cut(1e9)).toBeLessThanOrEqual(1 / 3);
  });

  it('acts by day more than in twilight, and not at night (Sullivan et al. 2018)', () => {
    expect(cut(2, 1, 0)).toBeGreaterThan(2 * cut(2, 0, 1));
    expect(cut(2, 0, 1)).toBeGreaterThan(0);
    expect(cut(2, 0, 0)).toBe(0);
  });

  it('adds up for repeats', () => {
    expect(left([event(0), event(DAY)], 2 * DAY)).toBeGreaterThan(left([event(DAY)], 2 * DAY));
  });

  it('is local to the stand: a tenth is left at 450 yd, nothing beyond reach', () => {
    expect(left([event(0, 'sit', 411)], 0)).toBeLessThan(0.11);
    expect(left([event(0, 'sit', s.reachM + 1)], 0)).toBe(0);
  });

  it('is all but over a day after a single bump (back within 13 h: D’Angelo et al. 2003; a day: Sweeney et al. 1971)', () => {
    expect(cut(left([event(0, 'bump')], (13 / 24) * DAY))).toBeLessThan(0.1);
    expect(cut(left([event(0, 'bump')], DAY))).toBeLessThan(0.05);
  });

  it('counts deer bumped on any visit, and nothing that has not happened yet', () => {
    expect(left([{ ...event(0, 'camera_check'), bumped: 3 }], 0.2 * DAY)).toBeGreaterThan(
      left([event(0, 'camera_check')], 0.2 * DAY),
    );
    expect(left([event(DAY)], 0)).toBe(0);
  });

  it('makes one more sit dearer on rested ground than on ground already pressed, and dearer tomorrow than next week', () => {
    expect(marginalCost(0, 1, s)).toBeGreaterThan(marginalCost(3, 1, s));
    expect(marginalCost(0, 1, s)).toBeGreaterThan(marginalCost(0, 7, s));
    expect(marginalCost(0, 1, s)).toBeCloseTo(cut(pressureAfterDays('sit', 0, 1, s)), 12);
  });

  it('raises the cost of alerting deer within its bounds', () => {
    expect(pressureOnQuiet(0, s)).toBe(1);
    expect(pressureOnQuiet(1e9, s)).toBeCloseTo(1 + s.extraAlert, 9);
  });
});
