import { eq } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { safetyContacts, users } from '@/db/schema';

export type ContactRow = typeof safetyContacts.$inferSelect;

/** By the account it belongs to, which stands in for a scope. */
export async function findContact(userId: string, from: ReadFrom = reader()): Promise<ContactRow | null> {
  const [row] = await from.select().from(safetyContacts).where(eq(safetyContacts.userId, userId));
  return row ?? null;
}

/** By the secret of the mailed link, with the name of the member who asks. */
export async function findContactBySecret(secretHash: string, from: ReadFrom = reader()) {
  const [row] = await from
    .select({ contact: safetyContacts, member: { id: users.id, name: users.name, email: users.email } })
    .from(safetyContacts)
    .innerJoin(users, eq(users.id, safetyContacts.userId))
    .where(eq(safetyContacts.secretHash, secretHash));
  return row ?? null;
}

export async function findMemberOfContact(userId: string, from: ReadFrom) {
  const [row] = await from
    .select({ contact: safetyContacts, member: { id: users.id, name: users.name, email: users.email } })
    .from(safetyContacts)
    .innerJoin(users, eq(users.id, safetyContacts.userId))
    .where(eq(safetyContacts.userId, userId));
  return row ?? null;
}

export async function saveContactRow(tx: Tx, row: typeof safetyContacts.$inferInsert): Promise<void> {
  const { userId: _, ...set } = row;
  await tx.insert(safetyContacts).values(row).onConflictDoUpdate({ target: safetyContacts.userId, set });
}

export async function updateContact(
  tx: Tx,
  userId: string,
  set: Partial<typeof safetyContacts.$inferInsert>,
): Promise<void> {
  await tx.update(safetyContacts).set(set).where(eq(safetyContacts.userId, userId));
}

export async function deleteContact(tx: Tx, userId: string): Promise<void> {
  await tx.delete(safetyContacts).where(eq(safetyContacts.userId, userId));
}
