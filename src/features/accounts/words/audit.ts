export const ACCOUNT_AUDIT = {
  unitsChosen: {
    us: (name: string) => `${name} now sees figures in US units.`,
    metric: (name: string) => `${name} now sees figures in metric units.`,
    club: (name: string) => `${name} now sees figures as each club has them.`,
  },
  passwordChanged: (name: string) => `${name} changed the password.`,
  emailConfirmed: (name: string) => `${name} confirmed the e-mail address.`,
  nameChanged: (before: string, after: string) => `${before} is now called ${after}.`,
  made: (name: string) => `${name} made an account.`,
  browserSignedOut: (name: string) => `${name} signed a browser out.`,
  signedOutEverywhere: (name: string) => `${name} signed out everywhere.`,
  passwordReset: (name: string) => `${name} chose a new password by mail.`,
} as const;
