import type { SitsAskText } from './ask-schema';
import { askText } from './read-addresses';

/** The Sit screen of a window, with a stand's row open where one is named. */
export function sitAddress(club: string, ask: SitsAskText & { stand?: string }): string {
  const text = askText({ ...ask });
  return `/clubs/${club}/sit${text ? `?${text}` : ''}`;
}
