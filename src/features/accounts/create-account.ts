import { type Tx, write } from '@/db/client';
import { newId } from '@/lib/ids';
import { hashPassword } from '@/server/passwords';
import { mailAccountExists, mailFinishAccount, mailVerifyLink } from './account-mails';
import type { SignUpInput } from './account-schema';
import { auditAccount } from './audit-account';
import { findUserByEmail, insertUser } from './data';
import { takeMailRate } from './rates';
import { ACCOUNT_AUDIT } from './words/audit';

interface NewAccount {
  name: string;
  email: string;
  passwordHash: string;
}

export async function addUserRow(tx: Tx, account: NewAccount, emailVerifiedAt: number | null, now: number) {
  const user = { id: newId('user'), ...account, emailVerifiedAt, createdAt: now };
  await insertUser(tx, user);
  await auditAccount(tx, user, 'created', ACCOUNT_AUDIT.made(user.name), now);
  return user;
}

/**
 * Makes an account that its e-mail address must confirm. The answer is the same for an address already known: its owner
 * is told by mail, and nothing of the old account changes.
 */
export async function createAccount(input: SignUpInput, source: { address: string }, now: number): Promise<void> {
  const { name, email, password } = input;
  await takeMailRate(email, source.address, now);
  const passwordHash = await hashPassword(password);
  await write(async (tx) => {
    const known = await findUserByEmail(email, tx);
    if (!known) {
      const user = await addUserRow(tx, { name, email, passwordHash }, null, now);
      return mailVerifyLink(tx, user, now);
    }
    return known.emailVerifiedAt === null ? mailFinishAccount(tx, known, now) : mailAccountExists(tx, known, now);
  });
}
