import type { Weapon } from '../types';

/** A weapon inside a sentence. */
export const WEAPON_WORDS: Record<Weapon, string> = {
  bow: 'bow',
  crossbow: 'crossbow',
  muzzleloader: 'muzzleloader',
  shotgun: 'shotgun',
  rifle: 'rifle',
};
