import type { Tx } from '@/db/client';
import { deleteUserSessions } from '@/db/queries/sessions';
import { AppError } from '@/server/errors';
import { auditAccount } from './audit-account';
import { addUserRow } from './create-account';
import { findUserByEmail, updateUser } from './data';
import { ACCOUNT_AUDIT } from './words/audit';
import { ACCOUNT_ERRORS } from './words/errors';

/**
 * For a person whose e-mail address is proven by the link they came with (an invitation). Hash the password before the
 * transaction. An account never confirmed is taken over; a confirmed one must sign in instead (conflict).
 */
export async function createAccountRow(
  tx: Tx,
  account: { name: string; email: string; passwordHash: string },
  now: number,
): Promise<{ id: string }> {
  const known = await findUserByEmail(account.email, tx);
  if (!known) return addUserRow(tx, account, now, now);
  if (known.emailVerifiedAt !== null) {
    throw new AppError('conflict', ACCOUNT_ERRORS.accountExists);
  }
  const { name, passwordHash } = account;
  await updateUser(tx, known.id, { name, passwordHash, emailVerifiedAt: now });
  await deleteUserSessions(tx, known.id);
  await auditAccount(tx, { id: known.id, name }, 'verified', ACCOUNT_AUDIT.emailConfirmed(name), now);
  return { id: known.id };
}

/** For a signed-in person who opened a link sent to the account's own address. */
export async function markVerified(tx: Tx, userId: string, now: number): Promise<void> {
  await updateUser(tx, userId, { emailVerifiedAt: now });
}
