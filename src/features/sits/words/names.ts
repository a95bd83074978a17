import type { WindowName } from '@/core/condition-types';
import type { Weapon } from '@/core/ground-types';

/** Names that a phone writes itself: apart from what formats times, which is heavy. */

export const WINDOW_WORDS: Record<WindowName, string> = { morning: 'morning', evening: 'evening' };

export const WEAPON_LABELS: Record<Weapon, string> = {
  bow: 'Bow',
  crossbow: 'Crossbow',
  muzzleloader: 'Muzzleloader',
  shotgun: 'Shotgun',
  rifle: 'Rifle',
};
