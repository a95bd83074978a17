import { DrizzleSQLiteAdapter } from '@lucia-auth/adapter-drizzle';
import { and, desc, eq, gt, ne } from 'drizzle-orm';
import type { Adapter } from 'lucia';
import { hashSecret } from '@/lib/secrets';
import { type ReadFrom, reader, type Tx, write } from '../client';
import { sessions, users } from '../schema';

const over = (db: ReadFrom) => new DrizzleSQLiteAdapter(db, sessions, users);

/** The library's own adapter over our reader and writer, with only a hash of each session's id in the database. */
export const sessionAdapter: Adapter = {
  async getSessionAndUser(id) {
    const [session, user] = await over(reader()).getSessionAndUser(hashSecret(id));
    return [session ? { ...session, id } : null, user];
  },
  getUserSessions: (userId) => over(reader()).getUserSessions(userId),
  setSession: (session) => write((tx) => over(tx).setSession({ ...session, id: hashSecret(session.id) })),
  updateSessionExpiration: (id, at) => write((tx) => over(tx).updateSessionExpiration(hashSecret(id), at)),
  deleteSession: (id) => write((tx) => over(tx).deleteSession(hashSecret(id))),
  deleteUserSessions: (userId) => write((tx) => over(tx).deleteUserSessions(userId)),
  deleteExpiredSessions: () => write((tx) => over(tx).deleteExpiredSessions()),
};

export function listSessions(userId: string, now: number) {
  return reader()
    .select()
    .from(sessions)
    .where(and(eq(sessions.userId, userId), gt(sessions.expiresAt, Math.floor(now / 1000))))
    .orderBy(desc(sessions.createdAt));
}

/** By the stored hash, and only the user's own. */
export async function deleteSessionRow(tx: Tx, userId: string, id: string): Promise<boolean> {
  const gone = await tx
    .delete(sessions)
    .where(and(eq(sessions.id, id), eq(sessions.userId, userId)))
    .returning({ id: sessions.id });
  return gone.length > 0;
}

/** All of a user's sessions, or all but one. */
export async function deleteUserSessions(tx: Tx, userId: string, exceptId?: string): Promise<void> {
  await tx.delete(sessions).where(and(eq(sessions.userId, userId), exceptId ? ne(sessions.id, exceptId) : undefined));
}
