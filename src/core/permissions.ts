/** Who may do what in a club, as plain data. Doors and screens read this same table. */

export const ROLES = ['admin', 'steward', 'member', 'guest', 'landowner'] as const;
export type Role = (typeof ROLES)[number];

export const PERMISSIONS = [
  'club.read',
  'rules.write',
  'members.read',
  'members.write',
  'audit.read',
  'stands.read',
  'stands.write',
  'features.read',
  'features.write',
  'approaches.write',
  'ground.export',
  'sits.read',
  'sits.book',
  'sits.book_for_others',
  'sits.cancel_any',
  'board.read',
  'board.sign_for_others',
  'closed_days.write',
  'feeds.own',
  'feeds.club',
  'mail.read',
  'log.read',
  'log.write',
  'log.read_all',
  'log.write_any',
  'visits.write',
  'report.read',
  'report.read_all',
  'harvest.read',
  'harvest.write',
  'harvest.write_any',
  'jobs.read',
  'chores.read',
  'chores.write',
  'inspections.write',
  'notices.own',
  'draws.enter',
  'draws.write',
] as const;
export type Permission = (typeof PERMISSIONS)[number];

const MEMBER = [
  'club.read',
  'stands.read',
  'features.read',
  'sits.read',
  'sits.book',
  'board.read',
  'feeds.own',
  'log.read',
  'log.write',
  'visits.write',
  'report.read',
  'harvest.read',
  'harvest.write',
  'chores.read',
  'notices.own',
  'draws.enter',
] as const satisfies readonly Permission[];

export const PERMISSIONS_BY_ROLE: Record<Role, readonly Permission[]> = {
  admin: PERMISSIONS,
  steward: [
    ...MEMBER,
    'members.read',
    'stands.write',
    'features.write',
    'approaches.write',
    'ground.export',
    'closed_days.write',
    'board.sign_for_others',
    'log.read_all',
    'log.write_any',
    'report.read_all',
    'harvest.write_any',
    'feeds.club',
    'chores.write',
    'inspections.write',
  ],
  member: MEMBER,
  /** Books only inside the dates of the invitation (access-window.ts) and never sees where features lie. */
  guest: ['club.read', 'sits.read', 'sits.book', 'board.read', 'notices.own'],
  landowner: ['club.read', 'board.read', 'closed_days.write', 'notices.own'],
};

/** Whether a role holds a permission. */
export function can(role: Role, permission: Permission): boolean {
  return PERMISSIONS_BY_ROLE[role].includes(permission);
}
