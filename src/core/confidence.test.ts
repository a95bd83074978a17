import { describe, expect, it } from 'vitest';
import { confidenceFor, type ForecastTrust } from './confidence';
import { DEFAULT_SCORE, sitScore } from './score';
import { wordFor } from './word';

const HOUR = 3_600_000;
const trust = (over: Partial<ForecastTrust> = {}): ForecastTrust => ({
  issuedAt: 0,
  leadHours: 10,
  spreadDeg: 28,
  missingShare: 0,
  ...over,
});
const level = (over: Partial<ForecastTrust>, ageHours = 1) =>
  confidenceFor(trust(over), ageHours * HOUR, DEFAULT_SCORE).level;

describe('confidence', () => {
  it('is high for a steady wind soon and falls with spread, lead, age and gaps', () => {
    expect(level({})).toBe('high');
    expect(level({ spreadDeg: 45 })).toBe('fair');
    expect(level({ leadHours: 60 })).toBe('fair');
    expect(level({}, 13)).toBe('fair');
    expect(level({ spreadDeg: 80 })).toBe('low');
    expect(level({ leadHours: 120 })).toBe('low');
    expect(level({}, 30)).toBe('low');
    expect(level({ missingShare: 0.5 })).toBe('low');
  });

  it('is low for a wind of no direction and none without a forecast', () => {
    expect(level({ spreadDeg: null })).toBe('low');
    expect(confidenceFor(null, 0, DEFAULT_SCORE)).toMatchObject({
      level: 'none',
      leadHours: null,
      forecastAgeHours: null,
    });
  });
});

describe('the score and its word', () => {
  it('gives quiet more weight than promise', () => {
    expect(DEFAULT_SCORE.quietPower).toBeGreaterThan(DEFAULT_SCORE.promisePower);
    expect(sitScore(0.8, 0.4, DEFAULT_SCORE)).toBeGreaterThan(sitScore(0.4, 0.8, DEFAULT_SCORE));
    expect(sitScore(1, 1, DEFAULT_SCORE)).toBe(100);
    expect(sitScore(0, 1, DEFAULT_SCORE)).toBe(0);
  });

  it('is Quiet from 70, Touchy from 40, Loud below', () => {
    expect([100, 70, 69.9, 40, 39.9, 0].map(wordFor)).toEqual(['Quiet', 'Quiet', 'Touchy', 'Touchy', 'Loud', 'Loud']);
  });
});
