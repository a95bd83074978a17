import { eq } from 'drizzle-orm';
import type { Tx } from '../client';
import { sentRequests } from '../schema';

export async function findSentRequest(tx: Tx, id: string): Promise<{ kind: string; subjectId: string } | null> {
  const [row] = await tx.select().from(sentRequests).where(eq(sentRequests.id, id));
  return row ?? null;
}

export async function insertSentRequest(tx: Tx, row: typeof sentRequests.$inferInsert): Promise<void> {
  await tx.insert(sentRequests).values(row);
}
