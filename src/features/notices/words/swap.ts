import { LOST } from '@/ui/words/lost';

export const SWAP_PAGE_WORDS = {
  title: 'Move a sit',
  mySits: 'My sits',
  notYours: 'Not your sit',
  notYoursText: 'A sit is moved by the member whose it is.',
  titleOf: (stand: string) => `Your sit at ${stand}`,
  lead: (when: string, time: string) => `${when}, ${time}`,
  now: 'By the newest forecast',
  free: 'Free and quieter',
  freeNote: 'Moving keeps day, window, weapon and guests, and is checked like any booking.',
  over: 'This sit can no longer be moved',
  overText: 'It has begun, was cancelled or has lapsed.',
  none: 'No free stand is quieter',
  noneText: 'Keep the sit, or cancel it and leave the ground to rest.',
  keep: 'Keep or cancel it in my sits',
} as const;

export const SWAP_LIST_WORDS = {
  moved: (stand: string) => `Moved to ${stand}`,
  notMoved: 'Not moved',
  wayIn: (way: string | null) => (way === null ? 'No way in is drawn for it' : `Walk in by ${way}`),
  move: (stand: string) => `Move to ${stand}`,
  moving: 'Moving…',
  lost: LOST,
} as const;

export const SWAP_ERRORS = { reload: 'Reload the page and try again.' } as const;
