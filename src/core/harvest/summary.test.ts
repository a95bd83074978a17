import { describe, expect, it } from 'vitest';
import { type SheetFacts, summarizeHarvest } from './summary';

const sheet = (more: Partial<SheetFacts>): SheetFacts => ({
  sex: 'doe',
  age: null,
  dressedKg: null,
  lactating: null,
  ...more,
});

describe('summarizeHarvest', () => {
  it('groups by sex and age and averages only what was weighed dressed', () => {
    const { total, groups } = summarizeHarvest([
      sheet({ age: '2.5', dressedKg: 45 }),
      sheet({ age: '2.5', dressedKg: 49 }),
      sheet({ age: '2.5' }),
      sheet({ sex: 'buck', age: '3.5', dressedKg: 70 }),
      sheet({ sex: 'buck' }),
    ]);
    expect(total).toBe(5);
    expect(groups).toEqual([
      { sex: 'buck', age: '3.5', count: 1, dressedKg: 70, weighed: 1 },
      { sex: 'buck', age: null, count: 1, dressedKg: null, weighed: 0 },
      { sex: 'doe', age: '2.5', count: 3, dressedKg: 47, weighed: 2 },
    ]);
  });

  it('takes the share in milk from grown does that were looked at', () => {
    const { lactation } = summarizeHarvest([
      sheet({ age: '2.5', lactating: true }),
      sheet({ lactating: false }),
      sheet({ age: 'fawn', lactating: false }),
      sheet({ age: '3.5' }),
      sheet({ sex: 'buck' }),
    ]);
    expect(lactation).toMatchObject({ yes: 1, looked: 2, share: { known: true, value: 0.5 } });
    expect(summarizeHarvest([]).lactation.share).toEqual({ known: false, why: 'no_does' });
  });
});
