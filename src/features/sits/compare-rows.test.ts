import { describe, expect, it } from 'vitest';
import { compareRows } from './compare-rows';
import type { SitDetailView } from './view-types';

const START = Date.UTC(2026, 10, 7, 11);
const club = { slug: 'oak', name: 'Oak Club', zone: 'America/New_York', units: 'us' as const };

function detail(more: Partial<SitDetailView>): SitDetailView {
  return {
    standId: 'a',
    name: 'Stand A',
    window: { day: '2026-11-07', window: 'morning', startAt: START, endAt: START + 4 * 3_600_000 },
    quiet: 80,
    promise: 40,
    score: 60,
    word: 'Quiet',
    arcs: [],
    hold: { share: 0.84, neverLeaves: 0.5, leavesAt: START + 3 * 3_600_000, worstAt: START, worstShare: 0.4 },
    windedChance: 0.1,
    scent: [],
    timeline: [],
    reasons: [],
    ways: [],
    counterfactuals: [],
    cautions: [],
    confidence: { level: 'fair', text: 'A day ahead' } as SitDetailView['confidence'],
    mayMap: true,
    ...more,
  };
}

const rowOf = (a: Partial<SitDetailView>, b: Partial<SitDetailView>, label: string) =>
  compareRows([detail(a), detail(b)], club).find((row) => row.label === label);

describe('compareRows', () => {
  it('names the better figure, and neither where whole points are equal', () => {
    expect(rowOf({ score: 60 }, { score: 71.4 }, 'Sit score')).toEqual({
      label: 'Sit score',
      texts: [['60'], ['71']],
      better: 1,
    });
    expect(rowOf({ quiet: 80.4 }, { quiet: 80.1 }, 'Quiet')?.better).toBeNull();
    expect(rowOf({ promise: 50 }, { promise: 20 }, 'Promise')?.better).toBe(0);
  });

  it('tells how the wind holds by the club’s clock, and says so where it is not known', () => {
    const row = rowOf({}, { hold: null }, 'Wind');
    expect(row?.texts).toEqual([['In a good arc 84 % of the sit', 'Likeliest out of it at 9:00 AM'], ['Not known']]);
    expect(row?.better).toBe(0);
  });

  it('parts what speaks for a stand from what speaks against it, and keeps out what weighs nothing', () => {
    const reason = (code: string, change: number) =>
      ({ code, text: code, change, part: 'quiet', evidence: 'practice' }) as SitDetailView['reasons'][number];
    const reasons = [reason('beds', -12), reason('food', 6), reason('sun', 0.2)];
    expect(rowOf({ reasons }, {}, 'Speaks for it')?.texts).toEqual([['+6 food'], ['Nothing of weight']]);
    expect(rowOf({ reasons }, {}, 'Speaks against it')?.texts).toEqual([['−12 beds'], ['Nothing of weight']]);
  });
});
