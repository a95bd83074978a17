import { LOST } from '@/ui/words/lost';

import type { FeedScope } from './feed-schema';

export const FEED_NAMES: Record<FeedScope, string> = { own: 'My sits', club: "The club's sits" };

export const CALENDAR_FEED_WORDS = {
  lost: LOST,
  none: 'No address is in use.',
  inUse: (madeOn: string, withPlace: boolean) =>
    `An address made on ${madeOn} is in use, ${withPlace ? 'with' : 'without'} stand positions.`,
  renewed: 'New address made; the old one is off',
  made: 'Address made',
  turnedOff: 'Address turned off',
  failed: 'That did not work',
  address: 'Address for your calendar',
  addressHint: 'Shown only now. In your calendar, add a calendar by its address and paste this.',
  withPlace: 'Put stand positions in the entries',
  withPlaceHint: 'Stand places are secrets: whoever sees your calendar sees them too.',
  make: 'Make an address',
  renewTitle: 'Make a new address?',
  renew: 'Make a new address',
  renewText: 'The address in use stops working at once. Calendars that hold it need the new one.',
  turnOffTitle: 'Turn the address off?',
  turnOff: 'Turn it off',
  turnOffText: 'Calendars that hold it are told nothing more of any sit.',
} as const;

/** What a calendar shows of a sit of somebody else, and of a work day. */
export const CALENDAR_ENTRY_WORDS = {
  meetAt: (place: string) => `Meet at ${place}`,
  booked: 'A sit is booked',
  sitOf: (member: string) => `Sit: ${member}`,
  sitOfAt: (member: string, stand: string) => `Sit: ${member}, ${stand}`,
} as const;

export const CALENDAR_AUDIT = {
  made: (feed: string, renewed: boolean, withPlace: boolean) =>
    `${renewed ? 'Renewed' : 'Made'} a calendar address: ${feed}${withPlace ? ', with stand positions' : ''}.`,
  turnedOff: (feed: string) => `Turned off a calendar address: ${feed}.`,
} as const;

export const CALENDAR_ERRORS = {
  scope: 'Choose my sits or the club.',
  notYours: (club: string) => `Your role in ${club} does not give you this calendar. Ask a club admin.`,
} as const;

export const CALENDAR_PAGE_WORDS = {
  title: 'Calendar',
  lead: 'An address that a calendar on a phone or a computer can follow. Whoever has the address can read it without a password: give it to nobody, and turn it off when it is no longer needed.',
  ownNote: 'Your sits with way in, guests and note. Cancelled ones show as cancelled.',
  clubNote: (privacy: string) => `Every sit of the club. ${privacy}`,
} as const;

export const CALENDAR_PRIVACY_WORDS = {
  namesAndStands: "By the club's rule it shows who sits and at which stand.",
  namesOnly: "By the club's rule it shows who sits, and stands only for your own sits.",
  busyOnly: "By the club's rule it shows that a sit is booked, and names only for your own.",
} as const;
