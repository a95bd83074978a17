import type { OverdueStep } from '@/core/outing/overdue-steps';
import type { OverdueStepRow } from '../overdue-data';

/** What officers read of the last step. */
export const CONTACT_FORECAST = {
  noConsent: 'They have no safety contact who agreed to be told: nobody at home is mailed.',
  off: 'They asked that their safety contact is not told this time: nobody at home is mailed.',
  now: 'Their safety contact is told now.',
  at: (time: string) => `Their safety contact is told at ${time}.`,
} as const;

export const OVERDUE_MAIL = {
  noRescue:
    'Windrest is no rescue service, and this mail sends nobody. When somebody may be hurt, call the emergency number.',
  member: {
    subject: (back: string) => `Are you out? Back by ${back}`,
    opening: (stand: string, back: string) =>
      `You said you would be back from ${stand} by ${back}, and have not signed out.`,
    button: 'Sign out, or move the time',
    after: 'If nobody hears from you, the club officers and then your safety contact are told.',
    footer: 'You get this because you are signed in on the board.',
  },
  officers: {
    subject: (member: string, stand: string) => `Overdue: ${member} at ${stand}`,
    opening: (member: string, back: string) => `${member} was to be back by ${back} and has not signed out.`,
    button: 'Open the board',
    call: 'Most often a sign-out was forgotten: call first, then look for the vehicle where it was parked.',
    signOut: 'On the board you can sign them out once you know that they are safe. It never closes by itself.',
    footer: (club: string) => `You get this because you are an officer of ${club}.`,
  },
  contact: {
    subject: (member: string, club: string) => `Overdue: ${member}, ${club}`,
    opening: (member: string, back: string) =>
      `${member} named you to be told: they were to be back from a deer stand by ${back} and have not signed out. The club's officers have been told.`,
    button: 'See where they went',
    call: 'Most often a sign-out was forgotten: call them first.',
    link: 'The link needs no account and works for three days. Whoever has it can open the page: pass it only to those who help.',
    footer: (member: string) =>
      `You get this because you agreed to be the safety contact of ${member}. The page lets you stop.`,
  },
} as const;

export const STAND_DOWN_MAIL = {
  outSubject: (member: string) => `Signed out: ${member}`,
  movedSubject: (member: string) => `New time: ${member}`,
  /** `by`: who signed them out; null: they did. */
  out: (member: string, stand: string, at: string, by: string | null) =>
    `${member} has been signed out from ${stand} at ${at}${by === null ? '' : `, by ${by}`}. Nothing more is to be done.`,
  moved: (member: string, stand: string, back: string) =>
    `${member} is still at ${stand} and is now to be back by ${back}. You are told again if that passes.`,
  button: 'Open the board',
  footer: 'You get this because you were told that they were overdue.',
} as const;

const OUTCOMES: Record<OverdueStepRow['outcome'], string> = {
  mailed: 'mailed',
  nobody: 'nobody',
  no_consent: 'no consent',
  off: 'off',
};

export function overdueAudit(member: string, stand: string, step: OverdueStep, outcome: OverdueStepRow['outcome']) {
  return `${member} is overdue at ${stand}; step ${step}: ${OUTCOMES[outcome]}.`;
}

export const SIT_LINK_WORDS = {
  title: 'A sit',
  deadTitle: 'This link does not work',
  deadText:
    'It has run out, was turned off, or is not whole. Ask whoever sent it for a new one. When somebody is missing, call them, then the emergency number.',
  signedOut: (at: string) => `Signed out at ${at}`,
  nothingToDo: 'Nothing more is to be done.',
  position: 'Position',
  whatToDo: 'What to do',
  whatToDoText:
    'Call them first: most often a sign-out was forgotten. Then ask the club, or look for the vehicle where it was parked. When they may be hurt, call the emergency number and read out what stands here.',
  told: {
    member: (at: string) => `The member was told at ${at}.`,
    officers: (at: string) => `Club officers were told at ${at}.`,
    contact: (at: string) => `The safety contact was told at ${at}.`,
  },
  noRescueTitle: 'Windrest is no rescue service',
  noRescue: "This page says what was written on the club's board, and sends nobody. Open it again to see what is new.",
  stopTitle: 'Not for you any more?',
} as const;
