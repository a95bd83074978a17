import { write } from '@/db/client';
import { deleteUserSessions } from '@/db/queries/sessions';
import { hashSecret } from '@/lib/secrets';
import { hashPassword } from '@/server/passwords';
import { mailPasswordChanged } from './account-mails';
import type { ResetInput } from './account-schema';
import { auditAccount } from './audit-account';
import { requireGoodPassword, spentLink } from './check-password';
import { findTokenOwner, findUserById, spendOlderTokens, spendToken, updateUser } from './data';
import { ACCOUNT_AUDIT } from './words/audit';

/** Sets a new password by a mailed link, which also proves the address. Every session of the account ends. */
export async function resetPassword(input: ResetInput, now: number): Promise<{ userId: string }> {
  const tokenHash = hashSecret(input.token);
  const owner = await findTokenOwner(tokenHash, 'reset_password', now);
  if (!owner) throw spentLink();
  requireGoodPassword(input.password, owner);
  const passwordHash = await hashPassword(input.password);
  return write(async (tx) => {
    const userId = await spendToken(tx, tokenHash, 'reset_password', now);
    const user = userId ? await findUserById(userId, tx) : null;
    if (!user) throw spentLink();
    await updateUser(tx, user.id, { passwordHash, emailVerifiedAt: user.emailVerifiedAt ?? now });
    await spendOlderTokens(tx, user.id, 'verify_email', now);
    await deleteUserSessions(tx, user.id);
    await mailPasswordChanged(tx, user, now);
    await auditAccount(tx, user, 'password_reset', ACCOUNT_AUDIT.passwordReset(user.name), now);
    return { userId: user.id };
  });
}
