export const SPENT_LINK_WORDS = {
  why: 'It was used already, is too old, or a newer one has been sent.',
  title: 'This link no longer works',
} as const;

export const ACCOUNT_PAGE_WORDS = {
  title: 'Account',
  yourClubs: 'Your clubs',
  name: 'Name',
  nameNote: 'Members of your clubs see it.',
  units: 'Units',
  unitsNote: 'How figures are shown to you, in every club. What others see stays as it is.',
  safetyContact: 'Safety contact',
  safetyContactNote: 'Somebody at home who is mailed when you have not signed out in time, in any of your clubs.',
  password: 'Password',
  signedInBrowsers: 'Signed-in browsers',
  signedInBrowsersNote: 'One you do not know? Sign it out, then change your password.',
} as const;

export const CLUBS_PAGE_WORDS = {
  title: 'Your clubs',
  start: 'Start a club',
  none: 'You are in no club yet',
  noneText:
    'Start one for your club, lease or family land. If your club is here already, ask its admin for an invitation and open the link in that mail.',
  account: 'Account',
} as const;

export const FORGOT_PAGE_WORDS = {
  title: 'Forgot your password',
  lead: 'We mail you a link to choose a new one.',
  back: 'Back to sign in',
} as const;

export const MAIL_HINT_WORDS = {
  localBefore: 'No mail leaves this machine: read it at ',
  localLink: 'kept mail',
  localAfter: ', a few seconds from now.',
  junk: 'Nothing there after some minutes? Look among the junk mail.',
} as const;

export const RESET_PAGE_WORDS = {
  title: 'Choose a new password',
  lead: (email: string) => `For ${email}. Every browser signed in with this account is signed out.`,
  askLink: 'Ask for a new link',
  ask: 'Ask for another.',
} as const;

export const SIGN_UP_PAGE_WORDS = {
  title: 'Make an account',
  lead: 'Then start your club, or open the invitation your club has mailed you.',
  haveOne: 'Have one already? ',
  signIn: 'Sign in',
} as const;

export const VERIFY_PAGE_WORDS = {
  title: 'Confirm your e-mail address',
  lead: (email: string) => `We mailed a link to ${email}. Open it to finish.`,
  meanwhile: 'You can look around meanwhile, but not invite anyone. ',
  goOn: 'Go on to your clubs',
} as const;

export const CONFIRM_PAGE_WORDS = {
  title: 'Confirm your e-mail address',
  lead: (email: string, owner: string) => `${email}, for the account of ${owner}.`,
  signIn: 'Sign in',
  spentText: 'Sign in: if the address still has to be confirmed, you can have a new link sent there.',
} as const;
