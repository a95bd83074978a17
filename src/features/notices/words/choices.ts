import type { NoticeKind } from '@/core/notices/notice-kinds';
import { LOST } from '@/ui/words/lost';

export const KIND_WORDS: Record<NoticeKind, { label: string; note: string }> = {
  wind_turned: {
    label: 'The wind turns on a sit I have booked',
    note: 'Once for each change, with the best free stand in its place.',
  },
  evening_before: {
    label: 'The evening before a sit',
    note: 'At six: when to leave the truck, the way in, the wind, the light.',
  },
  rest_over: { label: 'A stand has had its rest', note: 'In the morning, once for each stand.' },
  rules_changed: { label: "The club's rules change", note: 'What it said before and says now.' },
  draw_changed: {
    label: 'A draw opens, is published or called off',
    note: 'What I drew and why, and when a swap is offered to me.',
  },
  weekly: {
    label: 'A letter each Thursday',
    note: 'My sits, closed stands, my chores and work days of the week ahead.',
  },
};

/** In the middle of a sentence: 'mail about ...'. */
export const KIND_PHRASES: Record<NoticeKind, string> = {
  wind_turned: 'the wind turning on a booked sit',
  evening_before: 'the evening before a sit',
  rest_over: 'stands that have had their rest',
  rules_changed: "changes of the club's rules",
  draw_changed: 'draws of stands',
  weekly: 'the week ahead',
};

export const NOTICES_PAGE_WORDS = {
  title: 'Notices',
  lead: (club: string, email: string) => `What ${club} mails you, and when. It goes to ${email}.`,
  always: 'What always comes',
  alwaysText:
    'Your own bookings, changes and cancellations, those of sits you are a guest of, days or a stand closed under a sit of yours, and everything about being overdue. These do not wait for quiet hours.',
} as const;

export const CHOICES_FORM_WORDS = {
  kept: 'Your choice is kept',
  kinds: 'Mail me when',
  points: (points: number) => `${points} points`,
  windPoints: 'The wind counts as turned when quiet falls by',
  windPointsHint: "Or when the wind leaves the stand's good winds, however little quiet falls.",
  quietFrom: 'Nothing after',
  quietTo: 'And not before',
  quietNote:
    'What falls in these hours waits until they end. A wind that turns comes two hours before the sit at the latest. The same time twice: no quiet hours.',
  save: 'Save',
  saving: 'Saving…',
} as const;

export const CHOICES_ERRORS = {
  time: 'Give a time.',
  kind: 'Choose from the list.',
  points: 'Choose one of the list.',
} as const;

export const UNSUBSCRIBE_WORDS = {
  title: 'Stop mail',
  deadTitle: 'This link does not work',
  deadText: 'It is older than a year or not whole. Sign in and open Notices in your club to choose what you are told.',
  question: 'Stop this mail?',
  lead: (kind: NoticeKind) => `Mail about ${KIND_PHRASES[kind]}. Everything else you chose still comes.`,
  choose: 'Choose what you are told',
} as const;

export const UNSUBSCRIBE_BUTTON_WORDS = {
  stopped: (phrase: string) => `You get no more mail about ${phrase}.`,
  stop: 'Stop this mail',
  stopping: 'Stopping…',
  notStopped: 'Not stopped',
  lost: LOST,
} as const;
