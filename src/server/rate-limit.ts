import { write } from '@/db/client';
import { countRate } from '@/db/queries/rate-limits';
import { AppError } from './errors';
import { SERVER_ERRORS } from './words';

export interface RateRule {
  /** What is counted, such as `sign-in`. */
  name: string;
  most: number;
  windowMs: number;
}

/** Counts one try for each subject (an account, an address) and refuses past the rule's most. Kept in the database. */
export async function takeRate(rule: RateRule, subjects: string[], now: number): Promise<void> {
  const counts = await write(async (tx) => {
    const counted = [];
    for (const subject of subjects) counted.push(await countRate(tx, `${rule.name}:${subject}`, now, rule.windowMs));
    return counted;
  });
  const over = counts.filter((c) => c.count > rule.most);
  if (over.length === 0) return;
  const until = Math.max(...over.map((c) => c.windowStartAt + rule.windowMs));
  const minutes = Math.max(1, Math.ceil((until - now) / 60_000));
  throw new AppError('limit', SERVER_ERRORS.tooManyTries(minutes), {
    log: `${rule.name} over ${rule.most}`,
  });
}
