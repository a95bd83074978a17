export const CANCEL_SIT_WORDS = {
  what: (stand: string, when: string, toldMember: string | undefined) =>
    `${stand}, ${when}. The stand is free again at once. The sit stays on record as cancelled${
      toldMember ? `, and ${toldMember} is told by e-mail.` : '.'
    }`,
  done: 'Sit cancelled',
  doneText: (stand: string, when: string) => `${stand}, ${when}, is free again.`,
  reason: 'Reason',
  cancelSit: 'Cancel the sit',
  keep: 'Keep the sit',
  cancelSit2: (memberName: string) => `Cancel the sit of ${memberName}`,
  title: 'Cancel this sit',
} as const;

export const CANCEL_BUTTON_WORDS = {
  cancel: 'Cancel',
  cancelLabel: (stand: string, when: string) => `Cancel ${stand}, ${when}`,
} as const;

export const CHANGE_SIT_WORDS = {
  done: 'Sit changed',
  failed: 'This change cannot be made',
  standId: 'Stand',
  day: 'Day',
  windows: 'Window',
  weapon: 'Weapon',
  approachId: 'Way in',
  approachIdPlaceholder: 'Not said',
  note: 'Note',
  save: 'Save the change',
  keep: 'Keep as it is',
  care: 'Take care',
  changeLabel: (stand: string, when: string) => `Change ${stand}, ${when}`,
  title: 'Change this sit',
  description: "The club's rules are checked again for the new place and time.",
  change: 'Change',
} as const;

export const GUEST_WORDS = {
  guests: 'Guests',
  guestsHint: (most: number) => `At most ${most} at once.`,
  name: (n: number) => `Name of guest ${n}`,
  removeLabel: (n: number) => `Remove guest ${n}`,
  remove: 'Remove',
  add: 'Add a guest',
} as const;

export const PAST_SITS_WORDS = {
  ended: 'Ended',
  lapsed: 'Lapsed, unsigned',
  cancelledFor: (reason: string) => `Cancelled: ${reason}`,
  cancelled: 'Cancelled',
  caption: 'Your sits that have ended or were cancelled, the latest first',
  stand: 'Stand',
  when: 'When',
  clubTime: 'Club time',
  weapon: 'Weapon',
  end: 'How it ended',
} as const;

export const UPCOMING_SITS_WORDS = {
  when: 'When',
  clubTime: 'Club time',
  weapon: 'Weapon',
  wayIn: 'Way in',
  guests: 'Guests',
  note: 'Note',
} as const;

export const MY_SITS_PAGE_WORDS = {
  title: 'My sits',
  find: 'Find a stand',
  calendar: 'Put them in my calendar',
  toCome: 'To come',
  none: 'You hold no sit',
  noneText: 'Choose a day on the list of stands and book one.',
  past: 'Past',
  pastNote: 'Ended and cancelled sits stay on record.',
} as const;
