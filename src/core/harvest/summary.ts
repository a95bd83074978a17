import type { Figure } from '../indices';
import { shareInterval } from '../intervals';
import { AGE_CLASSES, type AgeClass, SEXES, type Sex } from './harvest-types';

/** What of a sheet is summed up. */
export interface SheetFacts {
  sex: Sex;
  age: AgeClass | null;
  /** Field-dressed weight, kg. Live weight is never taken for it. */
  dressedKg: number | null;
  /** Does only. */
  lactating: boolean | null;
}

export interface HarvestGroup {
  sex: Sex;
  /** null: age not estimated. */
  age: AgeClass | null;
  count: number;
  /** Mean dressed weight of those weighed so. */
  dressedKg: number | null;
  weighed: number;
}

export interface HarvestSummary {
  total: number;
  /** By sex, then by age from the youngest; groups without a deer are left out. */
  groups: HarvestGroup[];
  /** Share of does a year and a half or older in milk, of those looked at. */
  lactation: { yes: number; looked: number; share: Figure };
}

const AGES: readonly (AgeClass | null)[] = [...AGE_CLASSES, null];

/** Sheets by sex and age with mean dressed weights, and the share of grown does in milk (0-1). */
export function summarizeHarvest(sheets: readonly SheetFacts[]): HarvestSummary {
  const groups = SEXES.flatMap((sex) =>
    AGES.map((age): HarvestGroup => {
      const own = sheets.filter((sheet) => sheet.sex === sex && sheet.age === age);
      const weights = own.flatMap((sheet) => sheet.dressedKg ?? []);
      const mean = weights.length === 0 ? null : weights.reduce((sum, kg) => sum + kg, 0) / weights.length;
      return { sex, age, count: own.length, dressedKg: mean, weighed: weights.length };
    }),
  );
  const looked = sheets.filter((sheet) => sheet.sex === 'doe' && sheet.age !== 'fawn' && sheet.lactating !== null);
  const yes = looked.filter((sheet) => sheet.lactating).length;
  const all = looked.length;
  const share: Figure =
    all === 0 ? { known: false, why: 'no_does' } : { known: true, value: yes / all, ...shareInterval(yes, all) };
  return {
    total: sheets.length,
    groups: groups.filter((group) => group.count > 0),
    lactation: { yes, looked: all, share },
  };
}
