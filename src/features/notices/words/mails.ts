import type { NoticeKind } from '@/core/notices/notice-kinds';
import { KIND_PHRASES } from './choices';

/** Round every notice. */
export const NOTICE_MAIL = {
  hello: (name: string) => `Hello ${name},`,
  footer: (kind: NoticeKind) => `You get this because you chose mail about ${KIND_PHRASES[kind]}.`,
  stop: 'Stop this kind of mail',
  choose: 'Choose what you are told',
} as const;

export const EVENING_MAIL = {
  subject: (stand: string, when: string) => `Tomorrow: ${stand}, ${when}`,
  opening: (stand: string) => `You sit at ${stand} tomorrow.`,
  stand: 'Stand',
  when: 'When',
  whenOf: (when: string, time: string) => `${when}, ${time}`,
  leaveBy: 'Leave by',
  leaveByFrom: (clock: string, parking: string | null) => (parking ? `${clock} from ${parking}` : clock),
  wayIn: 'Way in',
  wayInOf: (way: string, walk: string, inBy: string) => `${way}, ${walk}; in by ${inBy}`,
  noWay: 'none is drawn for this stand',
  wind: 'Wind',
  sun: 'Sun',
  sunOf: (rise: string, set: string) => `up ${rise}, down ${set}`,
  light: 'Light',
  lightOf: (from: string, to: string, rule: string) => `${from} to ${to}. ${rule}`,
  button: 'Open my sits',
  safety: 'Harness on from ground to ground. Sign in on the board, and tell somebody at home when you will be back.',
} as const;

export const WIND_TURNED_MAIL = {
  subject: (stand: string, when: string) => `Wind turned: ${stand}, ${when}`,
  opening: (stand: string) => `A newer forecast has turned against your sit at ${stand}.`,
  sit: 'Your sit',
  sitOf: (when: string, time: string) => `${when}, ${time}`,
  before: 'Before',
  now: 'Now',
  best: 'Best free in its place',
  bestOf: (stand: string, worth: string) => `${stand}: ${worth}`,
  noBest: 'no free stand is quieter',
  button: (best: string | null) => (best === null ? 'See the sit' : `See it, and move to ${best}`),
  after: 'Moving is checked like any booking: somebody may be quicker. You may also cancel there.',
} as const;

export const RESTED_MAIL = {
  subject: (stands: string[]) => `Rested: ${stands.join(', ')}`,
  opening: (stands: string[], day: string) =>
    `${stands.join(', ')}: the rest after the last sit is over, from ${day} on.`,
  button: 'See the list',
} as const;

export const RULES_MAIL = {
  subject: (labels: string[]) => `Rules changed: ${labels.join(', ')}`,
  opening: (member: string, club: string) => `${member} changed the rules of ${club}.`,
  change: ({ label, before, after }: { label: string; before: string | null; after: string | null }) =>
    `${label}\nbefore: ${before ?? 'nothing'}\nnow: ${after ?? 'nothing'}`,
  button: 'Read the rules',
} as const;

export const WEEKLY_MAIL = {
  subject: (club: string) => `The week ahead at ${club}`,
  block: (title: string, lines: string[], none: string) => `${title}\n${lines.length > 0 ? lines.join('\n') : none}`,
  sits: 'Your sits',
  sit: (stand: string, when: string, time: string) => `${stand}: ${when}, ${time}`,
  noSits: 'You have none booked.',
  clubSits: (sits: number) => `The club has ${sits} ${sits === 1 ? 'sit' : 'sits'} booked in the week ahead.`,
  closed: 'Closed',
  wholeGround: 'The whole ground',
  goneStand: 'A stand',
  closure: (of: { what: string; from: string; to: string | null; reason: string }) =>
    `${of.what}: ${of.from} ${of.to === null ? 'until opened again' : `to ${of.to}`}, ${of.reason}`,
  noClosed: 'Nothing is closed.',
  chores: 'Your chores',
  chore: (title: string, due: string | null) => (due === null ? title : `${title}, due ${due}`),
  noChores: (free: number) => (free > 0 ? `None is yours; ${free} wait for somebody.` : 'None.'),
  workDays: 'Work days',
  workDay: (title: string, day: string, time: string) => `${title}: ${day}, ${time}`,
  noWorkDays: 'None is set.',
  button: 'Open the club',
} as const;

export const DRAW_MAILS = {
  opened: {
    subject: (when: string) => `Draw open: ${when}`,
    opening: (member: string, when: string) => `${member} opened the draw for ${when}.`,
    stands: 'Stands',
    closes: 'Entries close',
    closesAt: (day: string, clock: string) => `${day}, ${clock}`,
    note: 'Note',
    button: 'Enter the draw',
  },
  calledOff: {
    subject: (when: string) => `Draw called off: ${when}`,
    opening: (member: string, when: string) => `${member} called off the draw for ${when}.`,
    after: "Nothing is booked by it, and nobody's points change.",
    button: 'See the draw',
  },
  published: {
    /** `stand`: null when none was drawn. */
    subject: (stand: string | null, when: string) =>
      stand === null ? `No stand drawn: ${when}` : `Drawn: ${stand}, ${when}`,
    opening: (when: string) => `The draw for ${when} is published.`,
    outcome: (stand: string | null) => (stand === null ? 'You drew no stand.' : `Your stand: ${stand}.`),
    goneStand: 'a stand no longer in use',
    inWindow: (when: string, outcome: string) => `${when}: ${outcome}`,
    givenUp: 'That sit has been given up since.',
    button: 'See the draw',
  },
  swap: {
    subject: (theirs: string, own: string, when: string) => `Swap offered: ${theirs} for ${own}, ${when}`,
    opening: (of: { member: string; theirs: string; own: string; when: string }) =>
      `${of.member} offers you ${of.theirs} for your ${of.own}, ${of.when}.`,
    after: 'If you take it, both sits change hands at once, under every rule. If you do nothing, nothing changes.',
    button: 'See the offer',
  },
} as const;
