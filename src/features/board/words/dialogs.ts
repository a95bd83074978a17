import { LOST } from '@/ui/words/lost';

/** Texts of what opens from the board. */

export const SIGN_IN_WORDS = {
  title: (stand: string, who: string | null) => (who === null ? `Sign in: ${stand}` : `Sign in ${who}`),
  about: (stand: string, window: string, time: string) => `${stand}, ${window}, ${time}.`,
  kept: (stand: string, who: string | null) => (who === null ? `Sign in at ${stand}` : `Sign in ${who} at ${stand}`),
  signIn: 'Sign in',
  signingIn: 'Signing in',
  notNow: 'Not now',
  done: 'Signed in',
  doneText: (who: string, stand: string, backBy: string) => `${who} at ${stand}, back by ${backBy}.`,
} as const;

export const SIGN_OUT_WORDS = {
  title: (stand: string, who: string | null) => (who === null ? `Sign out from ${stand}?` : `Sign out ${who}?`),
  kept: (stand: string, who: string | null) =>
    who === null ? `Sign out from ${stand}` : `Sign out ${who} from ${stand}`,
  signOut: 'Sign out',
  stay: 'Stay signed in',
  own: 'You are out of the woods and nobody needs to look for you.',
  other: (who: string) => `Only when you know that ${who} is out and safe. Your name goes on record.`,
  lost: 'The server could not be reached. Try again, or call an officer.',
  done: 'Signed out',
  doneText: (who: string, stand: string) => `${who}, ${stand}.`,
} as const;

export const MOVE_WORDS = {
  title: (who: string | null) => (who === null ? 'Back later' : `${who} is back later`),
  now: (backBy: string) =>
    `Back by ${backBy}. The first time stays on record; the new one counts from now where that has passed.`,
  laterBy: 'Later by',
  choices: { '30': 'Half an hour', '60': 'An hour', '120': 'Two hours', '240': 'Four hours' },
  tracking: 'Tracking a deer',
  trackingHint: 'Said on the board, and to whoever is told.',
  move: 'Move the time',
  moving: 'Moving',
  notNow: 'Not now',
  done: 'Time moved',
  doneText: (who: string, backBy: string) => `${who} is to be back by ${backBy}.`,
} as const;

export const GROUND_FIELD_WORDS = {
  notSaid: 'Not said',
  backBy: 'Back by',
  backByHint: "At the parking place, by the club's clock. You can move it.",
  wayIn: 'Way in',
  parking: 'Parked at',
  vehicle: 'Vehicle',
  vehicleHint: 'Colour, make, plate: what somebody would look for.',
  noContact: 'Nobody at home is told when you are overdue:',
  nameOne: 'name a safety contact',
  contactOff: (name: string) => `Do not tell ${name} this time`,
  contactOffHint: 'Your safety contact. Otherwise they are mailed when you are overdue.',
} as const;

export const SHARE_WORDS = {
  title: 'A link for somebody at home',
  about: (who: string | null) =>
    `A page for this sit alone: stand, way in, parking, vehicle, back-by time and whether ${who === null ? 'you are' : `${who} is`} out. It needs no account and works until three days after the back-by time. Whoever has the link can open it.`,
  link: 'Link for somebody at home',
  linkHint: 'It is shown this once. Send it yourself.',
  make: 'Make a link',
  makeAnother: 'Make another link',
  turnOff: 'Turn all links off',
  off: 'The links no longer work.',
  lost: LOST,
} as const;

export const WALK_UP_WORDS = {
  title: 'Walk up',
  about: (window: string) => `A free stand for ${window}.`,
  stand: 'Stand',
  weapon: 'Weapon',
  take: 'Take it and sign in',
  taking: 'Signing in',
  care: 'Take care',
  notNow: 'Not now',
  notLoaded: 'Not loaded',
  looking: 'Looking for free stands',
  nothing:
    'No stand is open to you now: each is taken, resting, closed or kept free by a rule. The Sit page says which.',
  done: 'Booked and signed in',
  doneText: (stand: string, backBy: string) => `${stand}, back by ${backBy}.`,
} as const;
