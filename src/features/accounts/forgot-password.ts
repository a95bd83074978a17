import { write } from '@/db/client';
import { mailResetLink } from './account-mails';
import type { ForgotInput } from './account-schema';
import { findUserByEmail } from './data';
import { takeMailRate } from './rates';

/** Mails a link to choose a new password, if there is such an account; the answer never tells. */
export async function forgotPassword(input: ForgotInput, source: { address: string }, now: number): Promise<void> {
  await takeMailRate(input.email, source.address, now);
  await write(async (tx) => {
    const user = await findUserByEmail(input.email, tx);
    if (user) await mailResetLink(tx, user, now);
  });
}
