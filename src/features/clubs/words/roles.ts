import type { Role } from '@/core/permissions';

export const ROLE_WORDS: Record<Role, string> = {
  admin: 'Admin',
  steward: 'Steward',
  member: 'Member',
  guest: 'Guest',
  landowner: 'Landowner',
};

/** What a role may do, in a line for whoever gives it. */
export const ROLE_NOTES: Record<Role, string> = {
  admin: 'Everything, with members, rules and the audit log.',
  steward: 'Keeps stands, ground and closures, and hunts.',
  member: 'Sees the ground, books and hunts.',
  guest: 'Hunts between two days, and a named member answers for them. Never sees where deer features lie.',
  landowner: 'Sees the board and closes days. Does not hunt.',
};

/** 'a guest', 'an admin'. */
export function aRole(role: Role): string {
  return `${role === 'admin' ? 'an' : 'a'} ${role}`;
}
