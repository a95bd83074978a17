import { write } from '@/db/client';
import { clearRate } from '@/db/queries/rate-limits';
import { AppError } from '@/server/errors';
import { passwordMatches } from '@/server/passwords';
import type { SignInInput } from './account-schema';
import { findUserByEmail } from './data';
import { signInRateKey, takeSignInRate } from './rates';
import { ACCOUNT_ERRORS } from './words/errors';

/** Checks e-mail and password; the session is started by the caller. One answer for an unknown address and a wrong password. */
export async function signIn(
  input: Pick<SignInInput, 'email' | 'password'>,
  source: { address: string },
  now: number,
): Promise<{ userId: string; verified: boolean }> {
  await takeSignInRate(input.email, source.address, now);
  const user = await findUserByEmail(input.email);
  const matches = await passwordMatches(user?.passwordHash ?? null, input.password);
  if (!user || !matches) {
    throw new AppError('invalid', ACCOUNT_ERRORS.signIn);
  }
  await write((tx) => clearRate(tx, signInRateKey(input.email)));
  return { userId: user.id, verified: user.emailVerifiedAt !== null };
}
