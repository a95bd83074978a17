import { describe, expect, it } from 'vitest';
import { maySeeSightings } from './see-sightings';

const season = { id: 's', name: 'Rifle', weapons: ['rifle' as const], fromDay: '2026-11-01', toDay: '2026-11-30' };
const rules = (sightingsSeenBy: 'all' | 'officers' | 'after_season', seasons = [season]) => ({
  sightingsSeenBy,
  seasons,
});

describe('maySeeSightings', () => {
  it('is never for those who may not read the log', () => {
    expect(maySeeSightings('guest', rules('all'), '2026-11-07')).toBe(false);
    expect(maySeeSightings('landowner', rules('all'), '2026-11-07')).toBe(false);
  });

  it('is for officers and members as the rule says', () => {
    for (const rule of ['all', 'officers'] as const) {
      expect(maySeeSightings('steward', rules(rule), '2026-11-07')).toBe(true);
    }
    expect(maySeeSightings('admin', rules('after_season'), '2026-11-07')).toBe(false);
    expect(maySeeSightings('admin', rules('after_season'), '2026-12-01')).toBe(true);
    expect(maySeeSightings('member', rules('all'), '2026-11-07')).toBe(true);
    expect(maySeeSightings('member', rules('officers'), '2027-05-01')).toBe(false);
  });

  it('opens to members on the day after the last season of the hunting year', () => {
    const late = { ...season, id: 'late', fromDay: '2026-12-26', toDay: '2027-01-09' };
    expect(maySeeSightings('member', rules('after_season', [season, late]), '2026-12-01')).toBe(false);
    expect(maySeeSightings('member', rules('after_season', [season, late]), '2027-01-09')).toBe(false);
    expect(maySeeSightings('member', rules('after_season', [season, late]), '2027-01-10')).toBe(true);
    expect(maySeeSightings('member', rules('after_season', []), '2027-01-10')).toBe(false);
  });

  it('has opened years gone by, whatever dates stand in the rules now', () => {
    expect(maySeeSightings('member', rules('after_season', []), '2026-11-07', '2025-11-07')).toBe(true);
    expect(maySeeSightings('member', rules('officers'), '2026-11-07', '2025-11-07')).toBe(false);
  });
});
