import { describe, expect, it } from 'vitest';
import { can, PERMISSIONS, PERMISSIONS_BY_ROLE, ROLES } from './permissions';

describe('the permission table', () => {
  it('gives an admin everything and nobody a permission twice', () => {
    for (const p of PERMISSIONS) expect(can('admin', p)).toBe(true);
    for (const role of ROLES) {
      const held = PERMISSIONS_BY_ROLE[role];
      expect(new Set(held).size).toBe(held.length);
    }
  });

  it('keeps the ground and the rules from those who only hunt', () => {
    for (const p of [
      'rules.write',
      'members.write',
      'stands.write',
      'features.write',
      'sits.cancel_any',
      'audit.read',
    ] as const) {
      expect(can('member', p)).toBe(false);
    }
    expect(can('member', 'sits.book')).toBe(true);
    expect(can('member', 'features.read')).toBe(true);
  });

  it('shows guests and landowners no places', () => {
    expect(can('guest', 'features.read')).toBe(false);
    expect(can('guest', 'stands.read')).toBe(false);
    expect(can('guest', 'board.read')).toBe(true);
    expect([...PERMISSIONS_BY_ROLE.landowner].sort()).toEqual([
      'board.read',
      'closed_days.write',
      'club.read',
      'notices.own',
    ]);
  });

  it('lets a steward do all a member may, and work the ground', () => {
    for (const p of PERMISSIONS_BY_ROLE.member) expect(can('steward', p)).toBe(true);
    for (const p of [
      'stands.write',
      'features.write',
      'approaches.write',
      'visits.write',
      'closed_days.write',
    ] as const) {
      expect(can('steward', p)).toBe(true);
    }
    expect(can('steward', 'rules.write')).toBe(false);
  });
});
