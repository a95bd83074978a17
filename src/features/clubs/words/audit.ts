const sitsCancelled = (count: number) => `${count} booked ${count === 1 ? 'sit was' : 'sits were'} cancelled.`;

export const CLUB_AUDIT = {
  /** Part of the two below: a guest's days. */
  guestDays: (from: string, to: string, sponsor: string) => ` from ${from} to ${to} under ${sponsor}`,
  staySet: (officer: string, member: string, days: string) => `${officer} set ${member}'s stay:${days}.`,
  roleChanged: (officer: string, member: string, role: string, days: string, before: string) =>
    `${officer} made ${member} ${role}${days}; before, ${before}.`,
  invited: (officer: string, name: string, role: string, sponsor: string | null) =>
    `${officer} invited ${name} as ${role}${sponsor === null ? '' : `, under ${sponsor}`}.`,
  left: (member: string, cancelled: number) => `${member} left the club; ${sitsCancelled(cancelled)}`,
  removed: (officer: string, member: string, cancelled: number) =>
    `${officer} removed ${member}; ${sitsCancelled(cancelled)}`,
  rulesChanged: (officer: string, what: string) => `${officer} changed the rules: ${what}.`,
  placeChanged: (officer: string, what: string) => `${officer} changed the club's name, place or units: ${what}.`,
  started: (member: string, club: string) => `${member} started ${club}.`,
  auditTaken: (officer: string, rows: number) => `${officer} took ${rows} rows of the audit log out as a file.`,
  joined: (member: string, role: string, invitedAs: string) => `${member} joined as ${role}, invited as ${invitedAs}.`,
  invitationResent: (officer: string, name: string) => `${officer} sent the invitation to ${name} again.`,
  invitationRevoked: (officer: string, name: string) => `${officer} revoked the invitation to ${name}.`,
} as const;
