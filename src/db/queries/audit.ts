import { gt, sql } from 'drizzle-orm';
import { reader, type Tx } from '../client';
import { auditLog } from '../schema';

export async function insertAudit(tx: Tx, row: typeof auditLog.$inferInsert): Promise<void> {
  await tx.insert(auditLog).values(row);
}

/**
 * What has been written since the row `seen` (null: ever): the number of the newest row, and whether one is of this club or of
 * no club. Rows are only ever added, so their numbers rise in the order they were committed.
 */
export async function findNewAudit(clubId: string, seen: number | null): Promise<{ newest: number; own: boolean }> {
  const rowId = sql<number>`${auditLog}.rowid`;
  const from = reader();
  if (seen === null) {
    const [row] = await from.select({ newest: sql<number | null>`max(${rowId})` }).from(auditLog);
    return { newest: row?.newest ?? 0, own: true };
  }
  const [row] = await from
    .select({
      newest: sql<number | null>`max(${rowId})`,
      own: sql<number | null>`max(${auditLog.clubId} is null or ${auditLog.clubId} = ${clubId})`,
    })
    .from(auditLog)
    .where(gt(rowId, seen));
  return { newest: row?.newest ?? seen, own: row?.own === 1 };
}
