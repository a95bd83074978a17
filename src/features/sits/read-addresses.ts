import type { SitsAskText } from './ask-schema';

/** The query string of a read, without what is not asked; always in one order, since copies are kept by their address. */
export function askText(ask: Record<string, string | undefined>): string {
  const query = new URLSearchParams();
  for (const [key, value] of Object.entries(ask)) if (value) query.set(key, value);
  return query.toString();
}

export function detailAddress(club: string, standId: string, { day, window, weapon }: SitsAskText): string {
  return `/api/clubs/${club}/sits/${standId}?${askText({ day, window, weapon })}`;
}

export function listAddress(club: string, { day, window, weapon }: SitsAskText): string {
  return `/api/clubs/${club}/sits?${askText({ day, window, weapon })}`;
}

export function weekAddress(club: string, { weapon }: Pick<SitsAskText, 'weapon'>): string {
  return `/api/clubs/${club}/week?${askText({ weapon })}`;
}
