import { LOST } from '@/ui/words/lost';

export const AUDIT_FILTERS_WORDS = {
  person: 'Person',
  everyone: 'Everyone',
  what: 'What',
  everything: 'Everything',
  words: 'Words',
  fromDay: 'From day',
  toDay: 'To day',
  show: 'Show',
  clear: 'Clear',
} as const;

export const AUDIT_WORDS = {
  caption: 'What was done, the newest first',
  when: 'When',
  who: 'Who',
  what: 'What',
  inWords: 'In words',
  details: 'Details',
} as const;

export const DEAD_MAIL_WORDS = {
  to: (to: string) => `To ${to}`,
  lost: LOST,
  notSent: 'Not sent',
  again: (to: string) => `In the line again for ${to}`,
  working: 'Working…',
  sendLabel: (subject: string) => `Send again: ${subject}`,
  send: 'Send again',
} as const;

export const JOB_RUNS_WORDS = {
  started: 'Started',
  state: 'State',
  tries: 'Tries',
  itSaid: 'It said',
} as const;

export const AUDIT_FILE_HEADINGS = [
  'time (UTC)',
  'club day',
  'club time',
  'person',
  'action',
  'subject',
  'subject id',
  'summary',
  'detail',
] as const;
