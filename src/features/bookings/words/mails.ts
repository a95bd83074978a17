export const SIT_MAIL_WORDS = {
  subjects: {
    booked: (stand: string, when: string) => `Sit booked: ${stand}, ${when}`,
    changed: (stand: string, when: string) => `Sit changed: ${stand}, ${when}`,
    cancelled: (stand: string, when: string) => `Sit cancelled: ${stand}, ${when}`,
    lapsed: (stand: string, when: string) => `Sit lapsed: ${stand}, ${when}`,
  },
  /** `by` null: the reader. */
  booked: (by: string | null, stand: string) =>
    by === null ? `You booked ${stand}.` : `${by} booked ${stand} for you.`,
  changed: (by: string | null, _stand: string) => `${by ?? 'You'} changed your sit. This is how it stands now.`,
  cancelled: (by: string | null, stand: string, reason: string | null) =>
    `${by ?? 'You'} cancelled your sit at ${stand}.${reason ? ` The reason given: ${reason}` : ''}`,
  lapsed: (stand: string, minutes: number) =>
    `Your sit at ${stand} has lapsed: nobody signed in within ${minutes} minutes. The stand is free again.`,
  stand: 'Stand',
  when: 'When',
  clubTime: 'Club time',
  weapon: 'Weapon',
  wayIn: 'Way in',
  guests: 'Guests',
  note: 'Note',
  button: 'Open my sits',
  footer: 'You get this because the sit is yours.',
} as const;

interface GuestSit {
  by: string;
  host: string;
  stand: string;
}

/** To a guest with an account, of the sit of the member who takes them along. */
export const GUEST_MAIL_WORDS = {
  subjects: {
    booked: (stand: string, when: string) => `You come along: ${stand}, ${when}`,
    changed: (stand: string, when: string) => `Sit changed: ${stand}, ${when}`,
    cancelled: (stand: string, when: string) => `Sit cancelled: ${stand}, ${when}`,
    lapsed: (stand: string, when: string) => `Sit lapsed: ${stand}, ${when}`,
    left_out: (stand: string, when: string) => `You are off the sit: ${stand}, ${when}`,
  },
  booked: ({ by, host, stand }: GuestSit) =>
    by === host
      ? `${host} takes you along to ${stand} as a guest.`
      : `${by} booked ${stand} for ${host}, with you as a guest.`,
  changed: ({ by, host }: GuestSit) =>
    by === host
      ? `${host} changed the sit you come along on. This is how it stands now.`
      : `${by} changed the sit of ${host} you come along on. This is how it stands now.`,
  cancelled: ({ by, host, stand }: GuestSit, reason: string | null) =>
    `${by === host ? `${host} cancelled the sit` : `${by} cancelled the sit of ${host}`} at ${stand} you were to come along on.${reason ? ` The reason given: ${reason}` : ''}`,
  lapsed: ({ host, stand }: GuestSit, minutes: number) =>
    `The sit of ${host} at ${stand} has lapsed: nobody signed in within ${minutes} minutes. You are not expected there.`,
  left_out: ({ by, host, stand }: GuestSit) =>
    by === host
      ? `${host} goes to ${stand} without you: you are no longer a guest of that sit.`
      : `${by} took you off the sit of ${host} at ${stand}.`,
  host: 'Host',
  button: 'Open the board',
  footer: (host: string) => `You get this because ${host} named you as a guest.`,
} as const;

/** Of days or a stand that somebody closed under booked sits. */
export const CLOSED_MAIL_WORDS = {
  subject: (what: string, days: string) => `Closed: ${what}, ${days}`,
  /** `to`: null, until opened again. */
  days: (from: string, to: string | null, oneDay: boolean) => {
    if (to === null) return `from ${from} until opened again`;
    return oneDay ? from : `${from} to ${to}`;
  },
  opening: (by: string, what: string, sits: number) =>
    `${by} has closed ${what}, and ${sits === 1 ? 'a sit of yours falls' : `${sits} sits of yours fall`} on it.`,
  closed: 'Closed',
  when: 'When',
  why: 'Why',
  sit: 'Your sit',
  sitOf: (stand: string, when: string) => `${stand}, ${when}`,
  after: 'It stays booked until you or an admin cancels it: move it or cancel it, and do not go in while it is closed.',
  button: 'Move or cancel the sit',
  footer: 'You get this because the sit is yours.',
  officerOpening: (by: string, what: string, sits: number) =>
    `${by} has closed ${what}. ${sits} booked ${sits === 1 ? 'sit falls' : 'sits fall'} on it and ${sits === 1 ? 'stays' : 'stay'} booked; the members have been told.`,
  officerButton: 'See closed days',
  officerFooter: (club: string) => `You get this because you are an officer of ${club}.`,
} as const;
