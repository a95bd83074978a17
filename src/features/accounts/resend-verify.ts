import { write } from '@/db/client';
import { AppError } from '@/server/errors';
import { mailVerifyLink } from './account-mails';
import { takeMailRate } from './rates';
import { ACCOUNT_ERRORS } from './words/errors';

interface SignedIn {
  id: string;
  email: string;
  name: string;
  emailVerifiedAt: number | null;
}

export async function resendVerify(user: SignedIn, source: { address: string }, now: number): Promise<void> {
  if (user.emailVerifiedAt !== null) throw new AppError('conflict', ACCOUNT_ERRORS.emailConfirmed);
  await takeMailRate(user.email, source.address, now);
  await write((tx) => mailVerifyLink(tx, user, now));
}

/** Before anything that makes the club write to others. */
export function requireVerified(user: { emailVerifiedAt: number | null }): void {
  if (user.emailVerifiedAt !== null) return;
  throw new AppError('forbidden', ACCOUNT_ERRORS.confirmFirst);
}
