export const ACCOUNT_MAILS = {
  notYou: 'If this was not you, leave this mail alone: nothing happens.',
  hello: (name: string) => `Hello ${name},`,
  verifyOpening: 'One step is left: confirm that this e-mail address is yours.',
  verifyButton: 'Confirm and sign in',
  verifyLasts: 'The link works once, for 48 hours.',
  verifySubject: 'Confirm your e-mail address',
  existsOpening:
    'Somebody, perhaps you, asked for a new account with this e-mail address. You already have one: sign in with it.',
  existsButton: 'Sign in',
  existsForgotten: (url: string) => `Password forgotten? Choose a new one at ${url}/forgot`,
  existsSubject: 'You already have an account',
  finishOpening:
    'An account with this e-mail address was begun earlier and never finished. Choose a password to finish it.',
  finishButton: 'Choose a password',
  finishLasts: 'The link works once, for one hour.',
  finishSubject: 'Finish your account',
  resetOpening: 'Here is the link to choose a new password.',
  resetButton: 'Choose a new password',
  resetLasts: 'The link works once, for one hour. Choosing a new password signs you out everywhere.',
  changedOpening: 'Your password was changed, and other browsers were signed out.',
  changedButton: 'This was not me: choose a new password',
  changedSubject: 'Your password was changed',
} as const;
