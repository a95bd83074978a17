import { describe, expect, it } from 'vitest';
import { cropYearOf } from '@/core/map-layers';
import { emptyFeatureForm, type FeatureForm, featureFormOf, makeFeatureSchema } from './feature-schema';
import type { FeatureRow } from './features-data';
import { featuresInYear } from './features-in-year';

const club = { lat: 38.6, lon: -83.2, units: 'us' as const };
const form = (more: Partial<FeatureForm>): FeatureForm => ({
  ...emptyFeatureForm(),
  name: 'South Corn',
  kind: 'crop',
  places: '38.6, -83.2\n38.6, -83.19\n38.61, -83.19',
  ...more,
});
const read = (more: Partial<FeatureForm>) => makeFeatureSchema(club).safeParse(form(more));
const corn = { year: '2026', crop: 'Corn', months: ['7', '8', '9', '1'] };

describe('use by time of day', () => {
  it('is read from percent and shown again; blank leaves it to the kind', () => {
    const typed = { ...emptyFeatureForm().use, dawn: '35', dusk: '12.5' };
    const parsed = read({ use: typed });
    expect(parsed.data?.use).toEqual({ dawn: 0.35, dusk: 0.125 });
    if (parsed.success) expect(featureFormOf(parsed.data).use).toEqual(typed);
    expect(read({}).data?.use).toBeNull();
  });

  it('refuses more than a hundred in a hundred, beside its field', () => {
    const parsed = read({ use: { ...emptyFeatureForm().use, night: '140' } });
    expect(parsed.error?.issues.map(({ path }) => path.join('.'))).toEqual(['use.night']);
  });
});

describe('crops by year', () => {
  it('are read and shown again, for crop fields only', () => {
    const parsed = read({ rotation: [corn] });
    expect(parsed.data?.rotation).toEqual([{ year: 2026, crop: 'Corn', months: [1, 7, 8, 9] }]);
    expect(read({ kind: 'bedding', rotation: [corn] }).data?.rotation).toEqual([]);
  });

  it('hold one crop a year, each with a name and months', () => {
    const parsed = read({ rotation: [corn, { year: '2026', crop: ' ', months: [] }] });
    expect(parsed.error?.issues.map(({ path }) => path.join('.'))).toEqual([
      'rotation.1.year',
      'rotation.1.crop',
      'rotation.1.months',
    ]);
  });

  it("give a field the months of the year's crop until the next March is over", () => {
    const field: FeatureRow = {
      id: 'ftr_1',
      clubId: 'clb_1',
      name: 'South Corn',
      kind: 'crop',
      geometry: { type: 'Point', coordinates: [-83.2, 38.6] },
      months: [6],
      use: null,
      rotation: [{ year: 2026, crop: 'Corn', months: [7, 8, 1] }],
      notes: '',
      version: 1,
      removedAt: null,
    };
    const months = (day: string) => featuresInYear([field], cropYearOf(day))[0]?.months;
    expect(months('2026-11-07')).toEqual([7, 8, 1]);
    expect(months('2027-03-31')).toEqual([7, 8, 1]);
    expect(months('2027-04-01')).toEqual([6]);
    expect(months('2026-03-31')).toEqual([6]);
  });
});
