import { z } from 'zod';
import { DEFAULT_SETUP, SETUP_BOUNDS, SETUP_KEYS, type SetupSettings } from '@/core/setup-check/setup-settings';
import type { Units } from '@/core/units';
import { parseNumber } from '@/features/clubs/read-number';
import { type SettingKey, settingText, settingUnit, settingValue } from './setting-text';
import { SETTING_LABELS, SETTING_WORDS as W } from './words/settings';

const line = z.string().max(20, W.long);
const fields = Object.fromEntries(SETUP_KEYS.map((key) => [key, line])) as Record<SettingKey, typeof line>;

/** What the form holds: text in the reader's units; blank is the default. */
export const settingsFormSchema = z.object({ version: z.int().min(0), settings: z.object(fields) });
export type SettingsForm = z.output<typeof settingsFormSchema>;

function readOne(key: SettingKey, text: string, units: Units): number | string | null {
  if (text.trim() === '') return null;
  const { of, least, most } = SETUP_BOUNDS[key];
  const typed = parseNumber(text);
  const [from, to] = [settingText(key, least, units), settingText(key, most, units)];
  const label = SETTING_LABELS[key];
  if (of === 'months' && (typed === null || !Number.isInteger(typed))) return W.whole(label, from, to);
  // As they are shown, the bounds themselves may be typed.
  if (typed === null || typed < Number(from) || typed > Number(to)) {
    const unit = settingUnit(key, units);
    return W.outOfBounds(label, from, to, unit === '°' ? unit : ` ${unit}`);
  }
  return settingValue(key, typed, units);
}

/** From the form in the reader's units to the settings a club has of its own; what equals the default is none. */
export function makeSettingsSchema(units: Units) {
  return settingsFormSchema.transform(({ version, settings }, ctx) => {
    const own: Partial<SetupSettings> = {};
    let failed = false;
    const fail = (key: SettingKey, message: string) => {
      failed = true;
      ctx.addIssue({ code: 'custom', path: ['settings', key], message });
    };
    for (const key of SETUP_KEYS) {
      const read = readOne(key, settings[key], units);
      if (typeof read === 'string') fail(key, read);
      else if (read !== null && settings[key].trim() !== settingText(key, DEFAULT_SETUP[key], units)) own[key] = read;
    }
    const { scrapeFromM, scrapeToM } = { ...DEFAULT_SETUP, ...own };
    if (!failed && scrapeToM < scrapeFromM) fail('scrapeToM', W.order);
    return failed ? z.NEVER : { version, own };
  });
}

/** A club's own settings as the form shows them; blank where it has none. */
export function settingsToForm(own: Partial<SetupSettings>, units: Units, version: number): SettingsForm {
  const text = (key: SettingKey) => (own[key] === undefined ? '' : settingText(key, own[key], units));
  return {
    version,
    settings: Object.fromEntries(SETUP_KEYS.map((key) => [key, text(key)])) as SettingsForm['settings'],
  };
}
