import { and, asc, count, desc, eq, gte, isNull, lt, or, sql } from 'drizzle-orm';
import { addDays, localToUtc } from '@/core/day-time';
import { type ReadFrom, reader } from '@/db/client';
import { auditLog } from '@/db/schema';
import type { ClubScope } from '@/server/scope';
import type { AuditFilter } from './audit-schema';

export type AuditRow = typeof auditLog.$inferSelect;

/** Stands for rows that no person wrote. */
export const NOBODY = 'windrest';

/** Per cent and underscore mean themselves in what a person types. */
function contains(text: string): string {
  return `%${text.replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`;
}

function matching(scope: ClubScope, { person, action, from, to, text }: AuditFilter) {
  const { zone } = scope.club;
  const like = text === null ? null : contains(text);
  return and(
    eq(auditLog.clubId, scope.club.id),
    person === null ? undefined : person === NOBODY ? isNull(auditLog.actorUserId) : eq(auditLog.actorUserId, person),
    action === null ? undefined : eq(auditLog.action, action),
    from === null ? undefined : gte(auditLog.at, localToUtc(from, '00:00', zone)),
    to === null ? undefined : lt(auditLog.at, localToUtc(addDays(to, 1), '00:00', zone)),
    like === null
      ? undefined
      : or(
          sql`${auditLog.summary} like ${like} escape '\\'`,
          sql`${auditLog.actorName} like ${like} escape '\\'`,
          sql`${auditLog.subjectId} like ${like} escape '\\'`,
        ),
  );
}

/** The newest first. */
export function listAudit(
  scope: ClubScope,
  filter: AuditFilter,
  page: { most: number; skip: number },
  from: ReadFrom = reader(),
): Promise<AuditRow[]> {
  return from
    .select()
    .from(auditLog)
    .where(matching(scope, filter))
    .orderBy(desc(auditLog.at), desc(auditLog.id))
    .limit(page.most)
    .offset(page.skip);
}

export async function countAudit(scope: ClubScope, filter: AuditFilter, from: ReadFrom = reader()): Promise<number> {
  const [row] = await from.select({ rows: count() }).from(auditLog).where(matching(scope, filter));
  return row?.rows ?? 0;
}

/** Everyone who ever wrote a row, once for each account, under the name last used. */
export async function listAuditPeople(scope: ClubScope, from: ReadFrom = reader()) {
  const rows = await from
    .select({ userId: auditLog.actorUserId, name: auditLog.actorName, last: sql<number>`max(${auditLog.at})` })
    .from(auditLog)
    .where(eq(auditLog.clubId, scope.club.id))
    .groupBy(auditLog.actorUserId)
    .orderBy(asc(auditLog.actorName));
  return rows.map(({ userId, name }) => ({ id: userId ?? NOBODY, name }));
}

export async function listAuditActions(scope: ClubScope, from: ReadFrom = reader()): Promise<string[]> {
  const rows = await from
    .selectDistinct({ action: auditLog.action })
    .from(auditLog)
    .where(eq(auditLog.clubId, scope.club.id))
    .orderBy(asc(auditLog.action));
  return rows.map((row) => row.action);
}
