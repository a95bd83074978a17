import { SETUP_BOUNDS, type SetupSettings } from '@/core/setup-check/setup-settings';
import { mToYd, type Units, ydToM } from '@/core/units';
import { numberText } from '@/features/clubs/read-number';
import { UNIT_WORDS } from './words/settings';

export type SettingKey = keyof SetupSettings;

/** A setting as a form shows it: yards or metres, degrees, per cent, minutes. */
export function settingText(key: SettingKey, value: number, units: Units): string {
  const { of } = SETUP_BOUNDS[key];
  if (of === 'distance') return numberText(units === 'us' ? mToYd(value) : value, 1);
  return numberText(of === 'share' ? value * 100 : value, 1);
}

/** The same typed, as it is stored. */
export function settingValue(key: SettingKey, typed: number, units: Units): number {
  const { of } = SETUP_BOUNDS[key];
  if (of === 'distance') return units === 'us' ? ydToM(typed) : typed;
  return of === 'share' ? typed / 100 : typed;
}

export function settingUnit(key: SettingKey, units: Units): string {
  const { of } = SETUP_BOUNDS[key];
  if (of === 'distance') return units === 'us' ? 'yd' : 'm';
  return UNIT_WORDS[of];
}
