import { write } from '@/db/client';
import { clearRate } from '@/db/queries/rate-limits';
import { deleteUserSessions } from '@/db/queries/sessions';
import { hashSecret } from '@/lib/secrets';
import { AppError } from '@/server/errors';
import { hashPassword, passwordMatches } from '@/server/passwords';
import type { CurrentUser } from '@/server/session';
import { mailPasswordChanged } from './account-mails';
import type { ChangePasswordInput } from './account-schema';
import { auditAccount } from './audit-account';
import { requireGoodPassword } from './check-password';
import { findUserById, spendOlderTokens, updateUser } from './data';
import { signInRateKey, takeSignInRate } from './rates';
import { ACCOUNT_AUDIT } from './words/audit';
import { ACCOUNT_ERRORS } from './words/errors';

/** Needs the password that holds now; every other browser is signed out. */
export async function changePassword(
  user: CurrentUser,
  input: ChangePasswordInput,
  source: { address: string },
  now: number,
): Promise<void> {
  requireGoodPassword(input.password, user);
  await takeSignInRate(user.email, source.address, now);
  const row = await findUserById(user.id);
  if (!(await passwordMatches(row?.passwordHash ?? null, input.current))) {
    const message = ACCOUNT_ERRORS.wrongPassword;
    throw new AppError('invalid', message, { fields: { current: message } });
  }
  const passwordHash = await hashPassword(input.password);
  await write(async (tx) => {
    await updateUser(tx, user.id, { passwordHash });
    await spendOlderTokens(tx, user.id, 'reset_password', now);
    await deleteUserSessions(tx, user.id, hashSecret(user.sessionId));
    await clearRate(tx, signInRateKey(user.email));
    await mailPasswordChanged(tx, user, now);
    await auditAccount(tx, user, 'password_changed', ACCOUNT_AUDIT.passwordChanged(user.name), now);
  });
}
