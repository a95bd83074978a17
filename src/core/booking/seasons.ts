import { formatDay } from '../day-time';
import type { Weapon } from '../ground-types';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import { WEAPON_WORDS } from '../words/weapons';
import type { ClubRules, LegalLightRule, Season } from './rules';

/** A weapon in plain words. */
export function weaponWord(weapon: Weapon): string {
  return WEAPON_WORDS[weapon];
}

/** The seasons open on a day, for a weapon or (null) for any. */
export function openSeasons(seasons: readonly Season[], day: string, weapon: Weapon | null): Season[] {
  return seasons.filter((s) => s.fromDay <= day && day <= s.toDay && (weapon === null || s.weapons.includes(weapon)));
}

/** First day after `day` on which a season for the weapon is open; null when none is set. */
function nextOpenDay(seasons: readonly Season[], day: string, weapon: Weapon | null): string | null {
  const starts = seasons
    .filter((s) => s.fromDay > day && s.fromDay <= s.toDay && (weapon === null || s.weapons.includes(weapon)))
    .map((s) => s.fromDay)
    .sort();
  return starts[0] ?? null;
}

/** Season dates as the club set them; a club that set none is always open. */
export function seasonGates(rules: Pick<ClubRules, 'seasons'>, day: string, weapon: Weapon | null): Gate[] {
  const { seasons } = rules;
  if (seasons.length === 0 || openSeasons(seasons, day, weapon).length > 0) return [];
  const next = nextOpenDay(seasons, day, weapon);
  const opens = next === null ? GATE_WORDS.noLaterSeason : GATE_WORDS.nextSeason(formatDay(next, true));
  const open = openSeasons(seasons, day, null)
    .map((s) => s.name)
    .join(', ');
  const what =
    weapon !== null && open !== ''
      ? GATE_WORDS.otherWeapon(formatDay(day), open, weaponWord(weapon))
      : GATE_WORDS.outOfSeason(formatDay(day), weapon === null ? null : weaponWord(weapon));
  return [{ code: 'out_of_season', text: `${what} ${opens}`, endsOn: next }];
}

/** Weapons the stand is set up for. */
export function weaponGates(stand: { name: string; weapons: readonly Weapon[] }, weapon: Weapon | null): Gate[] {
  if (weapon === null || stand.weapons.includes(weapon)) return [];
  const text = GATE_WORDS.standWeapon(stand.name, weaponWord(weapon), stand.weapons.map(weaponWord));
  return [{ code: 'weapon', text, endsOn: null }];
}

/**
 * The club's legal-light rule of a day: that of the first open season which names one, else the club's only rule; null
 * when the club has said nothing that settles it.
 */
export function legalLightRuleOf(
  rules: Pick<ClubRules, 'seasons' | 'legalLight'>,
  day: string,
  weapon: Weapon | null,
): LegalLightRule | null {
  for (const season of openSeasons(rules.seasons, day, weapon)) {
    const rule = rules.legalLight.find((r) => r.name === season.legalLightName);
    if (rule) return rule;
  }
  return rules.legalLight.length === 1 ? (rules.legalLight[0] ?? null) : null;
}
