import { write } from '@/db/client';
import { deleteUserSessions } from '@/db/queries/sessions';
import { hashSecret } from '@/lib/secrets';
import { AppError } from '@/server/errors';
import { passwordMatches } from '@/server/passwords';
import type { VerifyInput } from './account-schema';
import { auditAccount } from './audit-account';
import { spentLink } from './check-password';
import { findTokenOwner, findUserById, spendToken, updateUser } from './data';
import { ACCOUNT_AUDIT } from './words/audit';
import { ACCOUNT_ERRORS } from './words/errors';

const NOT_THE_PASSWORD = ACCOUNT_ERRORS.otherPassword;

/**
 * Confirms an address by its link and the password: the link shows who reads the mail, the password who made the account.
 * Asking for both keeps a stranger from having an account confirmed for him. A wrong password does not use the link up.
 */
export async function verifyEmail({ token, password }: VerifyInput, now: number): Promise<{ userId: string }> {
  const owner = await findTokenOwner(hashSecret(token), 'verify_email', now);
  if (!owner) throw spentLink();
  if (!(await passwordMatches(owner.passwordHash, password))) {
    throw new AppError('invalid', NOT_THE_PASSWORD, { fields: { password: NOT_THE_PASSWORD } });
  }
  return write(async (tx) => {
    const userId = await spendToken(tx, hashSecret(token), 'verify_email', now);
    const user = userId ? await findUserById(userId, tx) : null;
    if (!user) throw spentLink();
    await updateUser(tx, user.id, { emailVerifiedAt: user.emailVerifiedAt ?? now });
    await deleteUserSessions(tx, user.id);
    await auditAccount(tx, user, 'verified', ACCOUNT_AUDIT.emailConfirmed(user.name), now);
    return { userId: user.id };
  });
}
