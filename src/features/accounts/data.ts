import { and, eq, gt, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { type TOKEN_PURPOSES, tokens, users } from '@/db/schema';

export type UserRow = typeof users.$inferSelect;
export type TokenPurpose = (typeof TOKEN_PURPOSES)[number];

export async function findUserByEmail(email: string, from: ReadFrom = reader()): Promise<UserRow | null> {
  const [row] = await from.select().from(users).where(eq(users.email, email));
  return row ?? null;
}

export async function findUserById(id: string, from: ReadFrom = reader()): Promise<UserRow | null> {
  const [row] = await from.select().from(users).where(eq(users.id, id));
  return row ?? null;
}

export async function insertUser(tx: Tx, row: typeof users.$inferInsert): Promise<void> {
  await tx.insert(users).values(row);
}

export async function updateUser(tx: Tx, id: string, set: Partial<typeof users.$inferInsert>): Promise<void> {
  await tx.update(users).set(set).where(eq(users.id, id));
}

export async function insertToken(tx: Tx, row: typeof tokens.$inferInsert): Promise<void> {
  await tx.insert(tokens).values(row);
}

/** Only the newest link of a purpose works. */
export async function spendOlderTokens(tx: Tx, userId: string, purpose: TokenPurpose, now: number): Promise<void> {
  await tx
    .update(tokens)
    .set({ usedAt: now })
    .where(and(eq(tokens.userId, userId), eq(tokens.purpose, purpose), isNull(tokens.usedAt)));
}

function fresh(tokenHash: string, purpose: TokenPurpose, now: number) {
  return and(
    eq(tokens.tokenHash, tokenHash),
    eq(tokens.purpose, purpose),
    isNull(tokens.usedAt),
    gt(tokens.expiresAt, now),
  );
}

/** Marks a fresh token used and gives its owner's id: of any number of tries one gets it. */
export async function spendToken(
  tx: Tx,
  tokenHash: string,
  purpose: TokenPurpose,
  now: number,
): Promise<string | null> {
  const [row] = await tx
    .update(tokens)
    .set({ usedAt: now })
    .where(fresh(tokenHash, purpose, now))
    .returning({ userId: tokens.userId });
  return row?.userId ?? null;
}

export async function findTokenOwner(tokenHash: string, purpose: TokenPurpose, now: number): Promise<UserRow | null> {
  const [row] = await reader()
    .select({ user: users })
    .from(tokens)
    .innerJoin(users, eq(users.id, tokens.userId))
    .where(fresh(tokenHash, purpose, now));
  return row?.user ?? null;
}
