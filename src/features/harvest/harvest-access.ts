import type { ClubScope } from '@/server/scope';
import type { HunterRow, Sheet } from './harvests-data';

/** Oneself, or a guest one answers for; an officer for anybody. */
export function mayWriteFor(scope: ClubScope, hunter: Pick<HunterRow, 'id' | 'role' | 'sponsorId'>): boolean {
  const { id } = scope.member;
  return hunter.id === id || (hunter.role === 'guest' && hunter.sponsorId === id) || scope.can('harvest.write_any');
}

/** A deer on one's own count, or an officer any. */
export function mayChange(scope: ClubScope, { sheet }: Pick<Sheet, 'sheet'>): boolean {
  return sheet.memberId === scope.member.id || scope.can('harvest.write_any');
}
