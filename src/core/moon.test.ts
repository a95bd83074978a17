import { Body, Illumination, MoonPhase } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import { moonAt } from './moon';

describe('moonAt', () => {
  it('names the four phases of November 2026 on their days (astronomy-engine SearchMoonPhase)', () => {
    // Phases by astronomy-engine, 2026-11: last quarter on the 1st, new on the 9th, first quarter on the 17th, full on the 24th.
    const at = (day: number) => Date.UTC(2026, 10, day, 12);
    expect([1, 9, 17, 24].map((day) => moonAt(at(day)).name)).toEqual([
      'Last quarter',
      'New moon',
      'First quarter',
      'Full moon',
    ]);
    expect([5, 13, 20, 28].map((day) => moonAt(at(day)).name)).toEqual([
      'Waning crescent',
      'Waxing crescent',
      'Waxing gibbous',
      'Waning gibbous',
    ]);
  });

  it('agrees with astronomy-engine on the lit share within 2 points and on the side it waxes', () => {
    for (let day = 0; day < 60; day++) {
      const at = Date.UTC(2026, 8, 1 + day, 5);
      const moon = moonAt(at);
      expect(Math.abs(moon.litShare - Illumination(Body.Moon, new Date(at)).phase_fraction)).toBeLessThan(0.02);
      const phase = MoonPhase(new Date(at));
      if (phase > 25 && phase < 155) expect(moon.name).toMatch(/Waxing|First/);
      if (phase > 205 && phase < 335) expect(moon.name).toMatch(/Waning|Last/);
    }
  });
});
