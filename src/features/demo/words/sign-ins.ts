export const DEMO_ERRORS = {
  notLaid: 'The demo club has not been laid here. Make an account and start a club.',
} as const;

/** A table of who can sign in, printed by the command that lays the demo. */
export const SIGN_IN_WORDS = {
  password: 'Demo sign-ins, all with the password',
  adminToo: (club: string) => `(also admin of ${club})`,
} as const;
