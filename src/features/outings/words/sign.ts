export const SIGN_IN_ERRORS = {
  cancelled: 'This sit was cancelled. Book it anew.',
  lapsed: 'This sit has lapsed, unsigned. Take the stand as a walk-up if it is still free.',
  ended: (at: string) => `This sit ended at ${at}.`,
  early: (at: string) => `Signing in opens at ${at}: sign in when you come to the gate.`,
  way: 'This is no way in to the stand. Choose another.',
  parking: 'This parking place is no longer there. Choose another.',
  stillIn: {
    you: (stand: string) => `You are still signed in at ${stand}. Sign out there first.`,
    member: (member: string, stand: string) => `${member} is still signed in at ${stand}. Sign out there first.`,
  },
  notSaved: 'Signing in was not saved. Try again.',
  noWindow: (opens: string) => `No window is near. Walk-ups open at ${opens}; until then book on the Sit page.`,
  nobodyIn: 'Nobody signed in for this sit, so there is nobody to sign out. Look at the board.',
  signedOut: (member: string, at: string) => `${member} signed out at ${at}.`,
} as const;

/** What only the member or an officer does. */
export const STRANGER_ERRORS = {
  signIn: (member: string) => `Only ${member} or an officer can sign in for this sit.`,
  signOut: (member: string) => `Only ${member} or an officer can sign out.`,
  move: (member: string) => `Only ${member} or an officer can move the back-by time.`,
  revoke: (member: string) => `Only ${member} or an officer can turn these links off.`,
} as const;

export const LINK_ERRORS = {
  notYours: (member: string) => `Only ${member} gives out a link to this sit.`,
  signedOut: 'You have signed out: there is nothing to share.',
} as const;

export const OUTING_FIELD_ERRORS = {
  missing: 'Choose one.',
  unknown: 'Choose one of the list.',
  vehicle: 'Use at most 80 characters: colour, make, plate.',
  backBy: 'Give a time.',
  weapon: 'Choose a weapon.',
  reload: 'Reload the page and try again.',
  minutes: 'Choose how much later.',
} as const;

export const OUTING_FACTS = {
  stand: 'Stand',
  wayIn: 'Way in',
  parking: 'Parked at',
  vehicle: 'Vehicle',
  guests: 'With',
  sit: 'Sit',
  signedIn: 'Signed in',
  backBy: 'Back by',
  lastSign: 'Last sign',
  notSaid: 'Not said',
} as const;

/** `later`: when it was pressed, where that was long before it was sent. */
const pressedBefore = (later: string | null) => (later === null ? '' : ` Pressed at ${later} and sent later.`);

export const OUTING_AUDIT = {
  signedIn: (of: { member: string; stand: string; when: string; back: string; later: string | null }) =>
    `Signed in ${of.member} at ${of.stand}, ${of.when}; back by ${of.back}.${pressedBefore(of.later)}`,
  signedOut: (of: { member: string; stand: string; at: string; later: string | null }) =>
    `Signed out ${of.member} from ${of.stand} at ${of.at}.${pressedBefore(of.later)}`,
  moved: (of: { member: string; stand: string; from: string; to: string; tracking: boolean }) =>
    `Moved the back-by time of ${of.member} at ${of.stand} from ${of.from} to ${of.to}${of.tracking ? ': tracking a deer' : ''}.`,
  linked: (member: string, stand: string) => `${member} made a link to their sit at ${stand} for somebody at home.`,
  unlinked: (links: number, member: string, stand: string) =>
    `Turned off ${links} ${links === 1 ? 'link' : 'links'} to the sit of ${member} at ${stand}.`,
  lapsed: (member: string, stand: string, when: string) =>
    `The sit of ${member} at ${stand} lapsed, unsigned: ${when}.`,
} as const;
