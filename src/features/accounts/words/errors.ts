export const FIELD_ERRORS = {
  name: 'Write the name your club knows you by.',
  nameLong: 'Use at most 60 characters.',
  nameSigns: 'Use letters, digits and plain signs only.',
  emailLong: 'That is too long for an e-mail address.',
  email: 'Write an e-mail address, such as name@example.com.',
  password: 'Write your password.',
  passwordLong: 'That is too long for a password.',
  newPasswordLong: (most: number) => `Use at most ${most} characters.`,
  link: 'This link is not whole. Open it from the mail again.',
  units: "Choose the club's units or your own.",
} as const;

export const PASSWORD_ERRORS = {
  short: (least: number) => `Use at least ${least} characters. A few plain words do well.`,
  long: (most: number) => `Use at most ${most} characters.`,
  ownName: 'Your name or e-mail address is the first thing anyone tries. Choose something else.',
  sameCharacter: 'The same character over and over is quickly guessed. Choose something else.',
} as const;

export const ACCOUNT_ERRORS = {
  wrongPassword: 'This is not your password now.',
  spentLink: 'This link was used already or is too old. Ask for a new one, and open the newest mail.',
  accountExists: 'You already have an account with this e-mail address. Sign in, then join.',
  emailConfirmed: 'Your e-mail address is confirmed already.',
  confirmFirst:
    'Confirm your own e-mail address before you invite others: open the link we mailed you, or have it sent again under Account.',
  signIn: 'E-mail address and password do not fit together. Check both and try again.',
  otherPassword:
    'That is not the password this account was made with. If somebody else made it, choose your own by "Password forgotten".',
} as const;
