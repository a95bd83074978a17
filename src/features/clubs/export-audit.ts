import { dayOf, formatClock } from '@/core/day-time';
import { write } from '@/db/client';
import { toCsv } from '@/lib/csv';
import type { ClubScope } from '@/server/scope';
import { auditClub } from './audit-club';
import { type AuditRow, listAudit } from './audit-data';
import type { AuditFilter } from './audit-schema';
import { CLUB_AUDIT } from './words/audit';
import { AUDIT_FILE_HEADINGS } from './words/records';

/** Our choice: some years of a large club, and a file that opens. */
const MOST_ROWS = 50_000;

function cells(scope: ClubScope, row: AuditRow): string[] {
  const { zone } = scope.club;
  return [
    new Date(row.at).toISOString(),
    dayOf(row.at, zone),
    formatClock(row.at, zone),
    row.actorName,
    row.action,
    row.subjectType,
    row.subjectId,
    row.summary,
    JSON.stringify(row.detail),
  ];
}

/** The rows a filter finds as CSV, the newest first. That they were taken out is itself put on record. */
export async function exportAudit(
  scope: ClubScope,
  filter: AuditFilter,
  now: number,
): Promise<{ name: string; csv: string }> {
  const rows = await write(async (tx) => {
    const found = await listAudit(scope, filter, { most: MOST_ROWS, skip: 0 }, tx);
    await auditClub(
      tx,
      scope,
      {
        action: 'audit.exported',
        subjectType: 'audit_log',
        subjectId: scope.club.id,
        summary: CLUB_AUDIT.auditTaken(scope.actor.name, found.length),
        detail: { ...filter },
      },
      now,
    );
    return found;
  });
  const name = `audit-${scope.club.slug}-${dayOf(now, scope.club.zone)}.csv`;
  return { name, csv: toCsv([AUDIT_FILE_HEADINGS, ...rows.map((row) => cells(scope, row))]) };
}
