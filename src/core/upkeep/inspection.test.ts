import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { STAND_KINDS } from '../ground-types';
import { dueState, INSPECTION_ITEMS, ITEM_ANSWERS, itemsFor, mildestResult, resultFits, strapDue } from './inspection';

describe('what is looked at', () => {
  it('asks of a stand in a tree for its tree, straps and lifeline, and of a ground blind for none of them', () => {
    expect(itemsFor('ladder')).toEqual(expect.arrayContaining(['tree', 'straps', 'ladder', 'lifeline', 'haul_rope']));
    expect(itemsFor('hang_on')).toContain('steps');
    expect(itemsFor('ground_blind')).toEqual(['seat', 'blind', 'noise', 'name_tag', 'lanes', 'path']);
    expect(itemsFor('natural_cover')).not.toContain('blind');
  });

  it('asks for every item of the list at some kind of stand', () => {
    const asked = new Set(STAND_KINDS.flatMap(itemsFor));
    expect(INSPECTION_ITEMS.filter((item) => !asked.has(item))).toEqual([]);
  });
});

describe('the result', () => {
  it('closes what is unsafe, and passes nothing that is to be mended', () => {
    expect(mildestResult({ seat: 'good', straps: 'none' })).toBe('pass');
    expect(mildestResult({ seat: 'fix', straps: 'good' })).toBe('fix_first');
    expect(mildestResult({ seat: 'fix', straps: 'unsafe' })).toBe('closed');
    expect(resultFits('pass', { seat: 'fix' })).toBe(false);
    expect(resultFits('closed', { seat: 'good' })).toBe(true);
  });

  it('never grows milder with one more thing found', () => {
    const order = ['pass', 'fix_first', 'closed'];
    const answer = fc.constantFrom(...ITEM_ANSWERS);
    fc.assert(
      fc.property(answer, answer, (a, b) => {
        const one = mildestResult({ seat: a });
        expect(order.indexOf(mildestResult({ seat: a, path: b }))).toBeGreaterThanOrEqual(order.indexOf(one));
      }),
    );
  });
});

describe('a strap', () => {
  it('lasts two years by common practice, and as long as its maker says where that is known', () => {
    // Two years: common practice among clubs, no standard.
    expect(strapDue({ fittedOn: '2024-08-15', makerYears: null })).toEqual({
      lastDay: '2026-08-15',
      years: 2,
      by: 'practice',
    });
    expect(strapDue({ fittedOn: '2024-08-15', makerYears: 1 })).toMatchObject({ lastDay: '2025-08-15', by: 'maker' });
    expect(strapDue({ fittedOn: '2024-08-15', makerYears: 2.5 })?.lastDay).toBe('2027-02-14');
    expect(strapDue({ fittedOn: null, makerYears: 1 })).toBeNull();
  });

  it('fitted on 29 February has its last day on the 28th, or the 29th of a leap year', () => {
    expect(strapDue({ fittedOn: '2024-02-29', makerYears: 1 })?.lastDay).toBe('2025-02-28');
    expect(strapDue({ fittedOn: '2024-02-29', makerYears: 4 })?.lastDay).toBe('2028-02-29');
  });

  it('is over the day after its last day and spoken of 30 days before', () => {
    const on = (today: string) => dueState('2026-08-15', today);
    expect(['2026-07-15', '2026-07-16', '2026-08-15', '2026-08-16'].map(on)).toEqual(['fine', 'soon', 'soon', 'over']);
  });
});
