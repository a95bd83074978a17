import { eq } from 'drizzle-orm';
import { sitWindow } from '@/core/windows';
import { reader } from '@/db/client';
import { outbox, outings, overdueSteps } from '@/db/schema';
import type { OutingDetail } from '@/features/outings/data';
import { type SignInSitValues, signInSitSchema } from '@/features/outings/outing-schema';
import { signIn } from '@/features/outings/sign-in';
import { SATURDAY } from './book';
import type { TestMember } from './make-club';

export const MINUTE = 60_000;
export const HOUR = 60 * MINUTE;

/** The instants of the test Saturday's windows in a member's club. */
export const windowAt = (who: TestMember, window: 'morning' | 'evening' = 'morning', day = SATURDAY) =>
  sitWindow(day, window, who.scope.club.rules, who.scope.club);

export function goIn(
  who: TestMember,
  sitId: string,
  now: number,
  more: Partial<SignInSitValues> = {},
): Promise<OutingDetail> {
  return signIn(who.scope, signInSitSchema.parse({ sitId, backBy: '11:30', ...more }), now);
}

/** What signing in and being overdue have written for a club. */
export async function outingRows(clubId: string) {
  return {
    outings: await reader().select().from(outings).where(eq(outings.clubId, clubId)),
    steps: await reader().select().from(overdueSteps).where(eq(overdueSteps.clubId, clubId)),
    mail: await reader().select().from(outbox).where(eq(outbox.clubId, clubId)),
  };
}
