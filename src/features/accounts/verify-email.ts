import { write } from '@/db/client';
import { deleteUserSessions } from '@/db/queries/sessions';
import { hashSecret } from '@/lib/secrets';
import { auditAccount } from './audit-account';
import { spentLink } from './check-password';
import { findUserById, spendToken, updateUser } from './data';

/** Confirms an address by its link. Sessions begun before the proof end: whoever began them had not shown who they are. */
export async function verifyEmail(token: string, now: number): Promise<{ userId: string }> {
  return write(async (tx) => {
    const userId = await spendToken(tx, hashSecret(token), 'verify_email', now);
    const user = userId ? await findUserById(userId, tx) : null;
    if (!user) throw spentLink();
    await updateUser(tx, user.id, { emailVerifiedAt: user.emailVerifiedAt ?? now });
    await deleteUserSessions(tx, user.id);
    await auditAccount(tx, user, 'verified', `${user.name} confirmed the e-mail address.`, now);
    return { userId: user.id };
  });
}
