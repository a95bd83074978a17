import type { Tx } from '../client';
import { auditLog } from '../schema';

export async function insertAudit(tx: Tx, row: typeof auditLog.$inferInsert): Promise<void> {
  await tx.insert(auditLog).values(row);
}
