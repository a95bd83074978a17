import type { Weapon } from '../ground-types';

/** A weapon inside a sentence. */
export const WEAPON_WORDS: Record<Weapon, string> = {
  bow: 'bow',
  crossbow: 'crossbow',
  muzzleloader: 'muzzleloader',
  shotgun: 'shotgun',
  rifle: 'rifle',
};
