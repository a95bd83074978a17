import { LOST } from '@/ui/words/lost';

import type { ContactState } from '../read-contact';

export const CONTACT_STATES: Record<ContactState, string> = {
  asked: 'Asked, no answer yet',
  expired: 'Did not answer in 14 days',
  agreed: 'Agreed',
  declined: 'Said no',
};

export const CONTACT_FORM_WORDS = {
  off: 'Switched off',
  askAgain: 'Save them again to ask once more.',
  switchOn: 'Switch on again',
  switchOff: 'Switch off for now',
  switchedOn: 'They are told again',
  switchedOff: 'They are not told any more',
  remove: 'Remove',
  removeTitle: 'Remove your safety contact?',
  removeText: 'Nobody at home is told when you are overdue, until you name somebody who agrees.',
  removed: 'Safety contact removed',
  notSaved: 'Not saved',
  lost: LOST,
  asked: 'Asked',
  askedText: 'They get a mail and answer there.',
  saved: 'Saved',
  name: 'Their name',
  email: 'Their e-mail address',
  emailHint: 'They are asked first, and told nothing until they agree.',
  save: 'Save the contact',
  ask: 'Ask them',
} as const;

export const CONTACT_ANSWER_WORDS = {
  agreed: (member: string) => `You are the safety contact of ${member}.`,
  declined: (member: string) => `You said no. You hear nothing more about ${member} from here.`,
  yes: 'Yes, tell me',
  no: 'No',
  stop: 'Stop being the contact',
  notSaved: 'Not saved',
  lost: LOST,
} as const;

export const CONTACT_PAGE_WORDS = {
  title: 'Safety contact',
  deadTitle: 'This link does not work',
  deadText:
    'It is older than 14 days, somebody else was asked since, or it is not whole. Open the newest mail again, or ask whoever named you to have it sent once more.',
  asks: (member: string) => `${member} asks you`,
  lead: (contact: string) => `${contact}, be their safety contact?`,
  what: (member: string) =>
    `When ${member} signs in at a deer stand, they say by when they will be back. If they have not signed out some time after that, and the club's officers have been told, you get one e-mail: where they sat, where they parked, their vehicle, and when they were to be back.`,
  stop: 'You may stop at any time, here or from any such mail.',
  noRescueTitle: 'Windrest is no rescue service',
  noRescue: 'It tells you, and sends nobody. When somebody may be hurt, call the emergency number.',
} as const;

export const CONTACT_ERRORS = {
  name: 'Write the name of the person to tell.',
  nameLong: 'Use at most 60 characters.',
  nameSigns: 'Use letters, digits and plain signs only.',
  secret: 'This link is not whole. Open it from the mail again.',
  answer: 'Answer yes or no.',
  unconfirmed: 'Confirm your own e-mail address first: your contact is asked in your name.',
  yourself: 'This is your own address. Name somebody else.',
  declined: (contact: string) => `${contact} said no. Talk to them, or name somebody else.`,
  none: 'You have named no safety contact.',
  dead: 'This link no longer works. Ask the person who named you to have it sent again.',
} as const;

export const CONTACT_AUDIT = {
  named: (member: string) => `${member} named a safety contact, who was asked.`,
  switched: (member: string, off: boolean) => `${member} switched their safety contact ${off ? 'off' : 'on'}.`,
  removed: (member: string) => `${member} removed their safety contact.`,
  answered: (member: string, agreed: boolean) => `The safety contact of ${member} ${agreed ? 'agreed' : 'said no'}.`,
} as const;

export const CONTACT_ASK_MAIL = {
  subject: (member: string) => `${member} asks you to be their safety contact`,
  hello: (name: string) => `Hello ${name},`,
  opening: (member: string, email: string) =>
    `${member} (${email}) hunts deer with a club that keeps its board on Windrest, and asks you to be their safety contact.`,
  what: 'If you agree, you get an e-mail when they are not back in time from a stand: where they sat, where they parked, their vehicle, and when they were to be back.',
  button: 'Answer yes or no',
  lasts: 'The link works for 14 days. If you do not answer, you hear nothing more.',
  noRescue: 'Windrest is no rescue service: it tells you, and sends nobody.',
  footer: (member: string) => `You get this because ${member} gave this address.`,
} as const;

export const CONTACT_ANSWER_MAIL = {
  subject: (contact: string, agreed: boolean) => (agreed ? `${contact} agreed` : `${contact} said no`),
  hello: (name: string) => `Hello ${name},`,
  agreed: (contact: string) => `${contact} has agreed to be your safety contact, and is mailed when you are overdue.`,
  declined: (contact: string) =>
    `${contact} does not want to be your safety contact. Nobody at home is mailed when you are overdue, until you name somebody who agrees.`,
  button: 'Open my account',
} as const;
