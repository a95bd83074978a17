import { and, asc, eq, gte, inArray } from 'drizzle-orm';
import { type ReadFrom, reader } from '@/db/client';
import { auditLog } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

const TOLD = ['draw.opened', 'draw.published', 'draw.cancelled', 'draw.swap_offered'];

export type DrawEvent = typeof auditLog.$inferSelect;

/** What happened to draws since an instant, the earliest first. */
export function listDrawEvents(scope: ClubScope, since: number, from: ReadFrom = reader()): Promise<DrawEvent[]> {
  return from
    .select()
    .from(auditLog)
    .where(and(eq(auditLog.clubId, scope.club.id), inArray(auditLog.action, TOLD), gte(auditLog.at, since)))
    .orderBy(asc(auditLog.at), asc(auditLog.id));
}
