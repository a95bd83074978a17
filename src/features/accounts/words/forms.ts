import { LOST } from '@/ui/words/lost';

export const ACCOUNT_FIELD_WORDS = {
  name: 'Your name',
  nameHint: 'As the club knows you. Members see it on the board.',
  email: 'E-mail',
  password: 'Password',
  newPassword: 'New password',
  passwordHint: 'At least 10 characters. A few plain words do well.',
} as const;

export const BROWSER_WORDS = {
  browserOn: (browser: string | undefined, system: string | undefined) => {
    if (!browser && !system) return 'A browser we do not know';
    return `${browser ?? 'A browser'} on ${system ?? 'a device we do not know'}`;
  },
  edge: 'Edge',
  opera: 'Opera',
  samsungInternet: 'Samsung Internet',
  firefox: 'Firefox',
  chrome: 'Chrome',
  safari: 'Safari',
  android: 'Android',
  windows: 'Windows',
  mac: 'Mac',
  linux: 'Linux',
} as const;

export const SIGN_OUT_WORDS = {
  lost: 'The server could not be reached. You are still signed in: try again.',
  waits: (count: number) =>
    `${count === 1 ? 'One press has' : `${count} presses have`} not been sent yet. Open a page of the club where there is a signal and it is sent; signing out drops it.`,
  signOut: 'Sign out',
  signingOut: 'Signing out…',
  loseTitle: 'Sign out and lose what waits?',
  lose: 'Sign out and lose it',
  stay: 'Stay signed in',
  everywhereTitle: 'Sign out everywhere?',
  everywhere: 'Sign out everywhere',
  everywhereText: 'Every browser with your account, this one too, has to sign in again.',
} as const;

export const CONFIRM_EMAIL_WORDS = {
  failed: 'That did not work',
  passwordHint: 'The one you chose when you made the account.',
  confirm: 'Confirm and sign in',
  passwordForgotten: 'Password forgotten',
} as const;

export const CONFIRM_EMAIL_NOTICE = {
  title: 'Confirm your e-mail address',
  beforeEmail: 'Open the link we mailed to ',
  afterEmail: '. Until then you cannot invite anyone.',
} as const;

export const FORGOT_WORDS = {
  sentTitle: 'Check your mail',
  sentBeforeEmail: 'If there is an account with ',
  sentAfterEmail: ', a link to choose a new password is on its way. It works once, for one hour.',
  email: 'E-mail of your account',
  send: 'Send the link',
} as const;

export const NAME_WORDS = {
  saved: 'Name saved',
  name: 'Your name',
  save: 'Save the name',
} as const;

export const PASSWORD_WORDS = {
  changed: 'Password changed',
  changedText: 'Your other browsers were signed out.',
  current: 'Password now',
  change: 'Change the password',
} as const;

export const RESET_WORDS = {
  set: 'Set it and sign in',
} as const;

export const SESSIONS_WORDS = {
  lost: LOST,
  here: 'This one',
  signedIn: (since: string, address: string) => `Signed in ${since}, from ${address}`,
  title: (browser: string) => `Sign ${browser} out?`,
  confirm: 'Sign it out',
  keep: 'Leave it',
  signOutLabel: (browser: string, since: string) => `Sign out ${browser}, signed in ${since}`,
  signOut: 'Sign out',
  text: 'Whoever uses it has to sign in again with the password.',
} as const;

export const SIGN_UP_WORDS = {
  sentTitle: 'Check your mail',
  sentBeforeEmail: 'We wrote to ',
  sentAfterEmail: '. Open the link in that mail to finish and sign in.',
  make: 'Make the account',
} as const;

export const UNITS_WORDS = {
  club: 'As the club has it',
  us: 'US',
  usNote: 'yards, feet, mph, °F, 12-hour clock',
  metric: 'Metric',
  metricNote: 'metres, km/h, °C, 24-hour clock',
  saved: 'Units saved',
  units: 'Figures and clock',
  save: 'Save the units',
} as const;
