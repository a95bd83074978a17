import type { WindowName } from '@/core/condition-types';
import { WINDOW_WORDS } from './names';

/** Texts of the Sit screen and its rows. */

export const SIT_PAGE_WORDS = { title: 'Sit' } as const;

/** 'Sat 14 Nov, morning' */
export const windowTitle = (dayText: string, window: WindowName) => `${dayText}, ${WINDOW_WORDS[window]}`;

export const SIT_LIST_WORDS = {
  wholeWeek: 'The whole week',
  overTitle: 'This window is over',
  over: 'The list shows how it stood.',
  youSit: (stand: string, windows: WindowName | 'all_day') =>
    `You sit at ${stand}, ${windows === 'all_day' ? 'all day' : windows}`,
  change: 'Change or cancel it',
  orMove: 'You can move to another stand below.',
  heading: 'Stands by sit score',
  noStandsTitle: 'No stands yet',
  addFirst: 'Add the first stand',
  addThem: 'A stand with its good winds is all a first list needs.',
  stewardAdds: 'A steward of the club adds them.',
  noneOpenTitle: 'No stand is open in this window',
  noneOpen: 'Each one below names the rule that stops it. Try the next window or another weapon.',
  blocked: 'Not open',
  blockedNote: 'How they would rank if they were, the best first.',
  until: (ends: string) => `${ends}.`,
  yourSit: 'Your sit',
  rank: (rank: number) => `${rank}. `,
} as const;

export const DETAIL_LOADING_WORDS = { reading: 'Reading the stand' } as const;

export const WINDOW_PICKER_WORDS = {
  windows: 'Windows',
  choose: 'Day, window and weapon',
  day: 'Day',
  window: 'Window',
  weapon: 'Weapon',
  anyWeapon: 'Any weapon',
  show: 'Show',
} as const;

export const ALMANAC_WORDS = {
  sun: 'Sun',
  sunrise: 'Sunrise',
  sunset: 'Sunset',
  upAllDay: 'up all day',
  downAllDay: 'down all day',
  unknown: '–',
  window: 'Window',
  firstLight: 'First light',
  lastLight: 'Last light',
  wind: 'Wind',
  air: 'Air',
  barometer: 'Barometer',
  moon: 'Moon',
  span: (from: string, to: string) => `${from} – ${to}`,
  lightFrom: (time: string) => `Light from ${time}.`,
  lightUntil: (time: string) => `Light until ${time}.`,
  lightFromRule: (time: string) => `Light from ${time} by the club's rule. State law decides.`,
  lightUntilRule: (time: string) => `Light until ${time} by the club's rule. State law decides.`,
} as const;

export const FORECAST_WORDS = {
  fresh: (source: string | null, age: string) => `Forecast: ${source}, fetched ${age}.`,
  oldTitle: (age: string) => `The forecast is old: fetched ${age}`,
  old: (why: string | null) => `${why ?? 'No newer one has come.'} The list stands on what there is; look at the sky.`,
  beyondTitle: 'No forecast for this window',
  beyond: 'The forecast does not reach it. Stands are ranked by their arcs, rest and way in alone.',
  noneTitle: 'No forecast',
  none: (why: string | null) =>
    `${why ?? 'None has come yet.'} Stands are ranked by their arcs, rest and way in alone.`,
} as const;
