import { DEFAULT_SETUP, SETUP_KEYS, type SetupSettings } from '@/core/setup-check/setup-settings';
import type { Units } from '@/core/units';
import { write } from '@/db/client';
import { audit } from '@/server/audit';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type SettingKey, settingText, settingUnit } from './setting-text';
import { getSetupSettings, putSetupSettings } from './settings-data';
import { SETTING_LABELS, SETTING_WORDS as W } from './words/settings';

const shown = (key: SettingKey, value: number, units: Units) =>
  `${settingText(key, value, units)} ${settingUnit(key, units)}`.replace(' °', '°');

/** Saves a club's own settings of the check; one that reads the same in the reader's units is not touched. */
export async function saveSetupSettings(
  scope: ClubScope,
  input: { version: number; own: Partial<SetupSettings> },
  now: number,
): Promise<{ changed: number }> {
  const { units, clubUnits, id } = scope.club;
  return write(async (tx) => {
    const held = await getSetupSettings(scope, tx);
    if (held.version !== input.version) throw new AppError('conflict', W.conflict);
    const own: Partial<SetupSettings> = {};
    const changes: string[] = [];
    for (const key of SETUP_KEYS) {
      const [before, typed] = [held.own[key], input.own[key]];
      const same =
        before !== undefined &&
        typed !== undefined &&
        settingText(key, before, units) === settingText(key, typed, units);
      const after = same ? before : typed;
      if (after !== undefined) own[key] = after;
      if (after === before) continue;
      const [from, to] = [before ?? DEFAULT_SETUP[key], after ?? DEFAULT_SETUP[key]];
      changes.push(W.change(SETTING_LABELS[key], shown(key, from, clubUnits), shown(key, to, clubUnits)));
    }
    if (changes.length === 0) return { changed: 0 };
    await putSetupSettings(scope, tx, { own, version: input.version });
    const entry = { clubId: id, actor: scope.actor, subjectType: 'club', subjectId: id };
    const summary = W.audit(changes.join('; '));
    await audit(
      tx,
      { ...entry, action: 'setup.settings_changed', summary, detail: { before: held.own, after: own } },
      now,
    );
    return { changed: changes.length };
  });
}
