import { getTimes } from 'suncalc';
import { describe, expect, it } from 'vitest';
import { apartDeg, turnDeg } from '@/core/angles';
import { cellOf, frontAt, synopticAt } from './fronts';
import { latestRun, MEMBER_COUNT, makeForecast } from './make-forecast';
import { makeWeather } from './make-weather';

const HOUR = 3_600_000;
const DAY = 24 * HOUR;
const PLACE = { lat: 34.1, lon: -84 };
const START = Date.UTC(2025, 8, 1);
const season = Array.from({ length: 120 * 24 }, (_, index) => START + index * HOUR);

const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;

describe('made weather', () => {
  it('is the same whatever was asked before, and the same for near neighbours only', () => {
    const forward = season.slice(0, 200).map((at) => makeWeather(PLACE, at));
    const backward = season
      .slice(0, 200)
      .toReversed()
      .map((at) => makeWeather(PLACE, at));
    expect(backward.toReversed()).toEqual(forward);
    const far = season.slice(0, 200).map((at) => makeWeather({ lat: 41, lon: -91 }, at).windFromDeg);
    expect(far).not.toEqual(forward.map((made) => made.windFromDeg));
    expect(cellOf({ lat: 34.101, lon: -84.002 })).toBe(cellOf(PLACE));
  });

  it('stays within what weather can be', () => {
    for (const at of season) {
      const made = makeWeather(PLACE, at);
      expect(Object.values(made).every(Number.isFinite)).toBe(true);
      expect(made.windFromDeg).toBeGreaterThanOrEqual(0);
      expect(made.windFromDeg).toBeLessThan(360);
      expect(made.windSpeedMps).toBeGreaterThanOrEqual(0);
      expect(made.windSpeedMps).toBeLessThan(20);
      expect(made.gustMps).toBeGreaterThanOrEqual(made.windSpeedMps);
      expect(made.cloudPercent).toBeGreaterThanOrEqual(0);
      expect(made.cloudPercent).toBeLessThanOrEqual(100);
      expect(made.precipMm).toBeGreaterThanOrEqual(0);
      expect(made.pressureHpa).toBeGreaterThan(980);
      expect(made.pressureHpa).toBeLessThan(1045);
      expect(made.tempC).toBeGreaterThan(-15);
      expect(made.tempC).toBeLessThan(40);
    }
  });

  it('moves without jumps: a minute changes it by little', () => {
    for (const at of season.slice(0, 1200)) {
      const one = makeWeather(PLACE, at + 17 * 60_000);
      const two = makeWeather(PLACE, at + 18 * 60_000);
      expect(apartDeg(one.windFromDeg, two.windFromDeg)).toBeLessThan(4);
      expect(Math.abs(one.windSpeedMps - two.windSpeedMps)).toBeLessThan(0.2);
      expect(Math.abs(one.tempC - two.tempC)).toBeLessThan(0.2);
    }
  });

  it('passes a front every 3 to 6 days, with the wind going round sunwise through it', () => {
    const cell = cellOf(PLACE);
    for (let index = 4500; index < 4560; index++) {
      const front = frontAt(cell, index);
      const days = (frontAt(cell, index + 1).at - front.at) / DAY;
      expect(days).toBeGreaterThanOrEqual(3);
      expect(days).toBeLessThanOrEqual(6);
      const turned = synopticAt(cell, front.at + 3 * HOUR).turnedDeg - synopticAt(cell, front.at - 3 * HOUR).turnedDeg;
      expect(turned).toBeGreaterThan(50);
      expect(turned).toBeLessThan(160);
      // South-westerly before, north-westerly after: the usual course of a cold front in the northern middle latitudes.
      expect(apartDeg(makeWeather(PLACE, front.at - 3 * HOUR).windFromDeg, 212)).toBeLessThan(65);
      expect(apartDeg(makeWeather(PLACE, front.at + 3 * HOUR).windFromDeg, 315)).toBeLessThan(65);
    }
  });

  it('has calm clear dawns, windy ones, rain and thunder in a season', () => {
    const dawns = Array.from({ length: 120 }, (_, day) => {
      const rise = getTimes(new Date(START + day * DAY + 17 * HOUR), PLACE.lat, PLACE.lon).sunrise;
      return makeWeather(PLACE, rise?.getTime() ?? Number.NaN);
    });
    const calmClear = dawns.filter((dawn) => dawn.windSpeedMps < 1 && dawn.cloudPercent < 30).length;
    expect(calmClear).toBeGreaterThan(15);
    expect(calmClear).toBeLessThan(90);
    expect(dawns.filter((dawn) => dawn.windSpeedMps > 4).length).toBeGreaterThan(10);
    const all = season.map((at) => makeWeather(PLACE, at));
    const wet = all.filter((made) => made.precipMm > 0.1).length / all.length;
    expect(wet).toBeGreaterThan(0.01);
    expect(wet).toBeLessThan(0.2);
    expect(all.filter((made) => made.weatherCode >= 95).length).toBeGreaterThan(3);
    expect(all.filter((made) => made.weatherCode >= 95 && made.precipMm === 0)).toEqual([]);
    const directions = new Set(all.map((made) => Math.floor(made.windFromDeg / 45)));
    expect(directions.size).toBe(8);
  });

  it('is coldest near dawn, warmest in the afternoon, windier by day, colder in December', () => {
    const bySolarHour = (hour: number) =>
      season.filter((at) => new Date(at).getUTCHours() === (hour + 6) % 24).map((at) => makeWeather(PLACE, at));
    const dawn = bySolarHour(5);
    const afternoon = bySolarHour(15);
    expect(mean(afternoon.map((made) => made.tempC)) - mean(dawn.map((made) => made.tempC))).toBeGreaterThan(5);
    expect(mean(afternoon.map((made) => made.windSpeedMps))).toBeGreaterThan(
      mean(dawn.map((made) => made.windSpeedMps)),
    );
    expect(mean(season.slice(0, 720).map((at) => makeWeather(PLACE, at).tempC))).toBeGreaterThan(
      mean(season.slice(-720).map((at) => makeWeather(PLACE, at).tempC)) + 8,
    );
    expect(Math.max(...bySolarHour(0).map((made) => made.radiationWm2))).toBe(0);
  });
});

describe('made forecasts', () => {
  const issuedAt = latestRun(START + 20 * DAY + 5 * HOUR);
  const at = (leadH: number) => issuedAt + leadH * HOUR;

  it('are the weather itself at lead zero and before', () => {
    for (const leadH of [-20, -1, 0])
      expect(makeForecast(PLACE, issuedAt, at(leadH), 3)).toEqual(makeWeather(PLACE, at(leadH)));
  });

  it('go further astray, and their members further apart, as lead grows', () => {
    const spread = (leadH: number) => {
      const apart: number[] = [];
      for (let run = 0; run < 60; run++) {
        const from = issuedAt + run * DAY;
        for (let member = 1; member <= MEMBER_COUNT; member++) {
          const plain = makeForecast(PLACE, from, from + leadH * HOUR).windFromDeg;
          apart.push(apartDeg(plain, makeForecast(PLACE, from, from + leadH * HOUR, member).windFromDeg));
        }
      }
      return mean(apart);
    };
    const [early, middle, late] = [spread(6), spread(48), spread(144)];
    expect(early).toBeGreaterThan(1);
    expect(middle).toBeGreaterThan(early);
    expect(late).toBeGreaterThan(middle);
    expect(early).toBeLessThan(20);
  });

  it('change little from one run to the next', () => {
    const moved: number[] = [];
    for (let run = 0; run < 60; run++) {
      const from = issuedAt + run * DAY;
      const valid = from + 60 * HOUR;
      const now = makeForecast(PLACE, from, valid);
      const next = makeForecast(PLACE, from + 6 * HOUR, valid);
      moved.push(Math.abs(turnDeg(now.windFromDeg, next.windFromDeg)));
    }
    expect(mean(moved)).toBeLessThan(15);
    expect(mean(moved)).toBeGreaterThan(0);
  });
});
