import { hashSecret } from '@/lib/secrets';
import { type RateRule, takeRate } from '@/server/rate-limit';

const MINUTE = 60_000;

/** How many tries an account and an address have; our choice: room for a bad memory, none for a guesser. */
const RULES = {
  signInAccount: { name: 'sign-in-account', most: 10, windowMs: 15 * MINUTE },
  signInAddress: { name: 'sign-in-address', most: 60, windowMs: 15 * MINUTE },
  demoAddress: { name: 'demo-sign-in-address', most: 20, windowMs: 15 * MINUTE },
  mailAccount: { name: 'account-mail-account', most: 5, windowMs: 60 * MINUTE },
  mailAddress: { name: 'account-mail-address', most: 30, windowMs: 60 * MINUTE },
} as const satisfies Record<string, RateRule>;

/** Known and unknown e-mail addresses are counted alike, and kept only as a hash. */
const subjectOf = (email: string) => hashSecret(email).slice(0, 32);

export const signInRateKey = (email: string) => `${RULES.signInAccount.name}:${subjectOf(email)}`;

/** Before a password is looked at. */
export async function takeSignInRate(email: string, address: string, now: number): Promise<void> {
  await takeRate(RULES.signInAddress, [address], now);
  await takeRate(RULES.signInAccount, [subjectOf(email)], now);
}

/** Before the demo's door is opened: each time makes a session. */
export const takeDemoRate = (address: string, now: number): Promise<void> =>
  takeRate(RULES.demoAddress, [address], now);

/** Before a mail about an account goes out. */
export async function takeMailRate(email: string, address: string, now: number): Promise<void> {
  await takeRate(RULES.mailAddress, [address], now);
  await takeRate(RULES.mailAccount, [subjectOf(email)], now);
}
