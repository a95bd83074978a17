import { reader } from '@/db/client';
import { AppError } from '@/server/errors';
import { listSignIns } from './data';
import { DEMO_SLUG } from './demo-place';
import { DEMO_ERRORS } from './words/sign-ins';

/** A member, no officer: what most people see, and what a stranger may try. */
const EMAIL = 'odalys@example.org';

/** Whom the demo's button signs in as. */
export async function findDemoMember(): Promise<{ userId: string; slug: string }> {
  const found = (await listSignIns(reader(), DEMO_SLUG)).find(({ email }) => email === EMAIL);
  if (!found) throw new AppError('unavailable', DEMO_ERRORS.notLaid);
  return { userId: found.userId, slug: DEMO_SLUG };
}
