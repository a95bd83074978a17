import { LOST } from '@/ui/words/lost';

export const ANSWER_WORDS = {
  lost: LOST,
  reasonNeeded: 'Say why it can stay as it is.',
  reasonLong: 'Keep it to 300 characters.',
  back: 'Back on the list',
  takeUp: 'Take it up again',
} as const;

export const ACCEPT_WORDS = {
  open: 'Make a chore',
  title: 'Make a chore of it',
  confirm: 'Make the chore',
  what: 'What is to be done',
  made: 'A chore was made',
} as const;

export const DISMISS_WORDS = {
  open: 'Leave it',
  title: 'Leave it as it is',
  text: 'It comes back when the ground it rests on changes.',
  why: 'Why it can stay',
  save: 'Leave it',
  saving: 'Saving…',
  done: 'Left as it is',
} as const;

/** Refusals, records and the chore that is made. */
export const RECORD_WORDS = {
  gone: 'This finding is gone: the ground has changed. Look at the list again.',
  changed: 'The ground has changed since you opened this page. Look at the finding again.',
  answeredBy: (name: string) => `${name} has answered this finding already.`,
  choreNotes: (text: string, why: string, rules: string) =>
    `From the set-up check: ${text}. ${why}${rules && `\n${rules}`}`,
  accepted: (text: string) => `Made a chore of a finding: ${text}.`,
  dismissed: (text: string, reason: string) => `Left a finding: ${text}. ${reason}`,
  reopened: (text: string) => `Took a finding up again: ${text}.`,
} as const;
