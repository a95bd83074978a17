import { describe, expect, it } from 'vitest';
import { type CautionInput, type CautionStep, cautionsFor } from './cautions';
import { fToC, mphToMps } from './units';

const HOUR = 3_600_000;
const step = (over: Partial<CautionStep> = {}): CautionStep => ({
  at: 0,
  speedMps: 2,
  gustMps: 3,
  tempC: 10,
  thunder: false,
  ...over,
});
const input = (over: Partial<CautionInput> = {}): CautionInput => ({
  kind: 'hang_on',
  seatHeightM: 6,
  steps: [step()],
  forecastAgeHours: 2,
  staleHours: 12,
  orangeRule: null,
  units: 'us',
  clock: (at) => `${at / HOUR}:00`,
  ...over,
});
const codes = (over: Partial<CautionInput>) => cautionsFor(input(over)).map((c) => c.code);
const inWind = (mph: number, gustMph: number) =>
  codes({ steps: [step({ speedMps: mphToMps(mph), gustMps: mphToMps(gustMph) })] });

describe('cautions', () => {
  it('warn of a raised seat from 20 mph or gusts of 30, and say stay down from 30 or gusts of 40 (design, under OSHA’s high wind)', () => {
    expect(inWind(19.9, 29.9)).not.toContain('wind_raised');
    expect(inWind(20, 22)).toContain('wind_raised');
    expect(inWind(12, 30)).toContain('wind_raised');
    expect(inWind(29.9, 39.9)).toContain('wind_raised');
    expect(inWind(30, 31)).toContain('wind_stay_down');
    expect(inWind(12, 40)).toContain('wind_stay_down');
  });

  it('say nothing of wind or a harness on the ground', () => {
    const steps = [step({ speedMps: 20, gustMps: 30 })];
    expect(codes({ kind: 'ground_blind', seatHeightM: 0, steps })).toEqual([]);
    expect(codes({})).toEqual(['harness']);
  });

  it('hold for 30 minutes after the last thunder (US National Weather Service)', () => {
    const steps = [0, 1, 2].map((h) => step({ at: h * HOUR, thunder: h < 2 }));
    const [first] = cautionsFor(input({ steps, kind: 'natural_cover', seatHeightM: 0 }));
    expect(first?.code).toBe('thunder');
    expect(first?.level).toBe('stop');
    expect(first?.text).toContain('(2:00)');
  });

  it('warn of frostbite at a wind chill of -19 F, as at 0 F and 15 mph (printed NWS value)', () => {
    const cold = cautionsFor(input({ steps: [step({ tempC: fToC(0), speedMps: mphToMps(15) })] }));
    expect(cold[0]).toMatchObject({ code: 'cold', level: 'caution' });
    expect(cold[0]?.text).toContain('-19 °F');
    expect(codes({ steps: [step({ tempC: 5 })] })).not.toContain('cold');
  });

  it('say when there is no forecast and when it is old, and repeat the club’s orange rule', () => {
    expect(codes({ forecastAgeHours: null })).toContain('no_forecast');
    expect(codes({ forecastAgeHours: 12.5 })).toContain('stale_forecast');
    expect(codes({ forecastAgeHours: 12 })).not.toContain('stale_forecast');
    const orange = cautionsFor(input({ orangeRule: 'Hat and vest while walking' })).find((c) => c.code === 'orange');
    expect(orange?.text).toBe('Hat and vest while walking');
  });
});
