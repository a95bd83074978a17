export const REMOVED_MAIL = {
  hello: (member: string) => `Hello ${member},`,
  opening: (club: string, why: string) => `You are no longer in ${club}. ${why}`,
  goes: 'Sits you had booked are cancelled, and your calendar addresses of this club no longer work. Your account stays.',
  subject: (club: string) => `You are no longer in ${club}`,
  takenOut: (officer: string) => `${officer} took you out of the club.`,
  sponsorGone: (sponsor: string) => `${sponsor}, who answered for you, is no longer in the club.`,
  left: 'You left the club.',
  sponsorLeft: (sponsor: string) => `${sponsor}, who answered for you, left the club.`,
} as const;

export const INVITATION_MAIL = {
  days: (from: string, to: string) => `You may hunt from ${from} to ${to}.`,
  hello: (name: string) => `Hello ${name},`,
  opening: (officer: string, club: string, role: string) => `${officer} invites you to join ${club} as ${role}.`,
  what: 'The club books its stands with Windrest: you see which stands are quiet, book one, and everyone knows who is where.',
  button: (club: string) => `Join ${club}`,
  lasts: (days: number, officer: string) =>
    `The link works once, for ${days} days. If you do not know ${officer}, leave this mail alone.`,
  subject: (officer: string, club: string) => `${officer} invites you to ${club}`,
} as const;
