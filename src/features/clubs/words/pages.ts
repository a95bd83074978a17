export const CLUB_AUDIT_PAGE_WORDS = {
  pages: (rows: number, page: number, pages: number) =>
    `${rows} ${rows === 1 ? 'row' : 'rows'}, page ${page} of ${pages}`,
  title: 'Audit log',
  lead: 'Every change, by whom and when. Nobody can change or delete a row.',
  takeOut: 'Take out as CSV',
  badFilter: 'This filter cannot be read, so all rows are shown',
  none: 'Nothing was found',
  noneText: 'Widen the days, or clear the filter.',
} as const;

export const CLUB_MAIL_PAGE_WORDS = {
  givenUp: (when: string, tries: number) => `Given up ${when} after ${tries} ${tries === 1 ? 'try' : 'tries'}.`,
  title: 'Mail',
  heading: 'Mail that was given up',
  lead: "Mail of this club that could not be delivered after several tries, or that the receiver's server refused.",
  none: 'None',
  noneText: 'Every mail of the club was delivered or is still being tried.',
} as const;

export const INVITE_PAGE_WORDS = {
  signedIn: (name: string, email: string) => `You are signed in as ${name} (${email}).`,
  otherEmail: (email: string, name: string) => `The invitation went to ${email}: join as ${name} only if both are you.`,
  signOutBefore: 'To join with another account, sign out under ',
  signOutLink: 'Account',
  signOutAfter: ' and open this link again.',
  otherAccountBefore: 'Have an account with another address? ',
  otherAccountLink: 'Sign in',
  otherAccountAfter: ' with it, then join.',
  title: 'Join a club',
  hasAccount: (email: string) => `You have an account with ${email}. Sign in, and you come back here to join.`,
  signIn: 'Sign in to join',
  spent: 'This invitation does not work',
  spentText:
    'It was used already, was revoked, is older than 14 days, or is not whole. Open the newest mail again, or ask whoever invited you for a new one.',
  firstPage: 'First page',
  inClub: (club: string) => `You are in ${club}`,
  open: 'Open the club',
  join: (club: string) => `Join ${club}`,
  lead: (name: string, role: string, roleNote: string) => `${name}, you are invited as ${role}. ${roleNote}`,
  days: (days: string) => `Your days: ${days}.`,
} as const;

export const CLUB_JOBS_PAGE_WORDS = {
  title: 'Jobs',
  lead: 'What the server does by the clock, for all its clubs.',
  none: 'No job has run',
  noneText:
    'Jobs run while the server is up, a few seconds after it starts. If this stays empty, they are switched off in its settings.',
  lastRuns: 'Last runs',
  lastFailed: 'Last that failed',
} as const;

export const CLUB_LAYOUT_WORDS = {
  club: 'Club',
  rules: 'Rules',
  members: 'Members',
  auditLog: 'Audit log',
  mail: 'Mail',
  jobs: 'Jobs',
} as const;

export const MEMBER_PAGE_WORDS = {
  title: 'Member',
  email: 'E-mail',
  role: 'Role',
  joined: 'Joined',
  guestDays: 'Guest days',
  sponsor: 'Sponsor',
  onlyAdmin: 'The only admin',
  onlyAdminText: (name: string) => `Make another member an admin before you change or remove ${name}.`,
  changeRole: 'Change the role',
  remove: 'Remove from the club',
  removeNote: 'What goes with it:',
} as const;

export const CLUB_MEMBERS_INVITE_PAGE_WORDS = {
  title: 'Invite someone',
  lead: 'They get a mail with a link to join.',
} as const;

export const CLUB_MEMBERS_PAGE_WORDS = {
  title: 'Members',
  invite: 'Invite someone',
  openInvitations: 'Open invitations',
  openInvitationsNote: 'Not taken yet. Each link works once, for 14 days.',
  none: 'None.',
} as const;

export const CLUB_PAGE_WORDS = {
  title: 'Club',
  name: 'Name',
  role: 'Role',
  joined: 'Joined',
  yourDays: 'Your days',
  sponsor: 'Sponsor',
  clubRules: 'Club rules',
  settingUp: 'Setting up',
  settingUpNote: 'What a club needs before its first sit, in this order.',
  setRules: 'Set the rules',
  ground: 'Put in parking and ground',
  stands: 'Add stands',
  invite: 'Invite members',
  theClub: 'The club',
  change: 'Change name or place',
  you: 'You in this club',
  onlyAdmin: 'You are the only admin. Make another member an admin before you leave.',
} as const;

export const CLUB_PLACE_PAGE_WORDS = {
  title: 'Name, place and units',
  lead: 'Sits already booked keep their hours when the place or the time zone changes.',
} as const;

export const CLUB_RULES_EDIT_PAGE_WORDS = {
  title: 'Change the rules',
  lead: 'They hold for every booking from now on. Sits already booked stay. Closed days are set under Closed days.',
} as const;

export const CLUB_RULES_PAGE_WORDS = {
  title: 'Club rules',
  change: 'Change the rules',
  lawTitle: 'State law decides',
  law: "These are the club's own rules, with the source and the day its officers gave. Windrest declares no time and no method legal.",
} as const;

export const NEW_PAGE_WORDS = {
  title: 'Start a club',
  yourClubs: 'Your clubs',
  lead: 'For a club, a lease or family land. You become its admin and can change everything but the address later.',
} as const;

export const CLUB_SHELL_WORDS = {
  account: 'Account and sign out',
  clubs: 'My clubs',
} as const;
