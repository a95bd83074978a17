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
