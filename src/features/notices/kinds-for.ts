import { NOTICE_KINDS, type NoticeKind } from '@/core/notices/notice-kinds';
import { can, type Permission, type Role } from '@/core/permissions';

const NEEDS: Partial<Record<NoticeKind, Permission>> = {
  wind_turned: 'sits.book',
  evening_before: 'sits.book',
  rest_over: 'stands.read',
  draw_changed: 'draws.enter',
};

/** Kinds of notice that can ever reach a role. */
export function kindsFor(role: Role): NoticeKind[] {
  return NOTICE_KINDS.filter((kind) => {
    const needs = NEEDS[kind];
    return needs === undefined || can(role, needs);
  });
}
