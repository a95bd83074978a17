import { eq, lt } from 'drizzle-orm';
import type { Tx } from '../client';
import { sentRequests } from '../schema';

export async function findSentRequest(tx: Tx, id: string): Promise<{ kind: string; subjectId: string } | null> {
  const [row] = await tx.select().from(sentRequests).where(eq(sentRequests.id, id));
  return row ?? null;
}

export async function insertSentRequest(tx: Tx, row: typeof sentRequests.$inferInsert): Promise<void> {
  await tx.insert(sentRequests).values(row);
}

/** Gives how many went. */
export async function deleteOldSentRequests(tx: Tx, before: number): Promise<number> {
  const gone = await tx.delete(sentRequests).where(lt(sentRequests.at, before)).returning({ id: sentRequests.id });
  return gone.length;
}
