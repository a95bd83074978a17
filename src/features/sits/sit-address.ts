import type { SitsAskText } from './ask-schema';

/** The Sit screen of a window, with a stand's row open where one is named. */
export function sitAddress(club: string, ask: SitsAskText & { stand?: string }): string {
  const query = new URLSearchParams();
  for (const [key, value] of Object.entries(ask)) if (value) query.set(key, value);
  const text = query.toString();
  return `/clubs/${club}/sit${text ? `?${text}` : ''}`;
}
