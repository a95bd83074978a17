import { describe, expect, it } from 'vitest';
import { DEFAULT_SETUP, SETUP_BOUNDS, SETUP_KEYS, type SetupSettings } from '@/core/setup-check/setup-settings';
import { UNIT_SYSTEMS, type Units } from '@/core/units';
import { settingText } from './setting-text';
import { makeSettingsSchema, settingsToForm } from './settings-schema';
import { SETTING_GROUPS } from './words/settings';

function read(changes: Partial<Record<keyof SetupSettings, string>>, units: Units = 'us') {
  const form = settingsToForm({}, units, 0);
  return makeSettingsSchema(units).safeParse({ ...form, settings: { ...form.settings, ...changes } });
}
const own = (...args: Parameters<typeof read>) => read(...args).data?.own;
const problems = (...args: Parameters<typeof read>) =>
  read(...args).error?.issues.map(({ path, message }) => `${path.join('.')}: ${message}`);

describe('settings of the set-up check', () => {
  it('are asked for in groups that leave none out and none twice', () => {
    expect(SETTING_GROUPS.flatMap(({ keys }) => keys).sort()).toEqual([...SETUP_KEYS].sort());
  });

  it('have defaults inside their bounds', () => {
    for (const key of SETUP_KEYS) {
      expect(DEFAULT_SETUP[key]).toBeGreaterThanOrEqual(SETUP_BOUNDS[key].least);
      expect(DEFAULT_SETUP[key]).toBeLessThanOrEqual(SETUP_BOUNDS[key].most);
    }
  });

  it('are read in the units of the reader; blank and the default are none of one’s own', () => {
    expect(own({})).toEqual({});
    expect(own({ pullWithinM: '100' })).toEqual({});
    // 80 yd = 73.152 m by the definition of the yard.
    expect(own({ pullWithinM: '80' })?.pullWithinM).toBeCloseTo(73.152, 9);
    expect(own({ pullWithinM: '80' }, 'metric')).toEqual({ pullWithinM: 80 });
    expect(own({ upwindShare: '60', scentDeg: '25' })).toEqual({ upwindShare: 0.6, scentDeg: 25 });
  });

  it('come back as they were typed', () => {
    for (const units of UNIT_SYSTEMS) {
      const typed = { pullWithinM: '120.5', sunMinutes: '60', leastUse: '12' };
      const form = settingsToForm(own(typed, units) ?? {}, units, 3);
      expect(form.settings).toMatchObject({ ...typed, besideM: '' });
      expect(form.version).toBe(3);
    }
  });

  it('are refused outside their bounds, beside their field', () => {
    expect(problems({ pullWithinM: '301' })).toEqual([
      'settings.pullWithinM: An attraction pulls deer about a seat from within: type a number from 20 to 300 yd.',
    ]);
    expect(problems({ behindDeg: 'far' })?.[0]).toContain('from 90 to 180°.');
    expect(problems({ sunMonths: '2.5' })?.[0]).toContain('whole number from 1 to 5');
    expect(problems({ scrapeFromM: '40' })).toEqual([
      'settings.scrapeToM: The farthest shot is not nearer than the nearest.',
    ]);
  });

  it('take the bounds as they are shown, in either unit', () => {
    for (const units of UNIT_SYSTEMS) {
      for (const key of SETUP_KEYS) {
        const alone =
          key === 'scrapeFromM' ? { scrapeToM: settingText('scrapeToM', SETUP_BOUNDS.scrapeToM.most, units) } : {};
        const least = key === 'scrapeToM' ? { scrapeFromM: settingText('scrapeFromM', 0, units) } : {};
        for (const bound of [SETUP_BOUNDS[key].least, SETUP_BOUNDS[key].most]) {
          expect(problems({ ...alone, ...least, [key]: settingText(key, bound, units) }, units)).toBeUndefined();
        }
      }
    }
  });
});
