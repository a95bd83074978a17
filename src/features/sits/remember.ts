import type { WindowName } from '@/core/condition-types';
import { WEAPONS, type Weapon } from '@/core/ground-types';

export const WEAPON_COOKIE = 'sit_weapon';
const YEAR_SECONDS = 365 * 24 * 3600;
const WINDOW_KEY = 'sit-window';

/** The weapon last chosen in this browser, of those that exist. */
export function keptWeapon(cookie: string | undefined): Weapon | undefined {
  return WEAPONS.find((weapon) => weapon === cookie);
}

/** Keeps the choice for the next visit; empty: any weapon. */
export function keepWeapon(weapon: string): void {
  const age = weapon ? YEAR_SECONDS : 0;
  // biome-ignore lint/suspicious/noDocumentCookie: the Cookie Store API is missing from older phones
  document.cookie = [`${WEAPON_COOKIE}=${weapon}`, 'path=/clubs', `max-age=${age}`, 'samesite=lax'].join('; ');
}

export interface KeptWindow {
  day: string;
  window: WindowName;
  startAt: number;
  /** 'Sat 14 Nov, morning' */
  title: string;
}

/** The window last looked at in this tab, so that a look at the board does not lose it. */
export function keepWindow(club: string, { day, window, startAt, title }: KeptWindow): void {
  try {
    sessionStorage.setItem(`${WINDOW_KEY} ${club}`, JSON.stringify({ day, window, startAt, title }));
  } catch {
    // A browser that keeps nothing only loses the way back.
  }
}

export function readKeptWindow(club: string): KeptWindow | null {
  try {
    const kept: unknown = JSON.parse(sessionStorage.getItem(`${WINDOW_KEY} ${club}`) ?? 'null');
    return isKeptWindow(kept) ? kept : null;
  } catch {
    return null;
  }
}

function isKeptWindow(kept: unknown): kept is KeptWindow {
  if (typeof kept !== 'object' || kept === null) return false;
  const { day, window, startAt, title } = { day: null, window: null, startAt: null, title: null, ...kept };
  const isWindow = window === 'morning' || window === 'evening';
  return typeof day === 'string' && isWindow && typeof startAt === 'number' && typeof title === 'string';
}
