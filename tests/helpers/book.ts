import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import type { ClubRules } from '@/core/booking/rules';
import { reader } from '@/db/client';
import { auditLog, claims, outbox, sits } from '@/db/schema';
import { bookSit } from '@/features/bookings/book-sit';
import { type BookSitInput, bookSitSchema } from '@/features/bookings/sit-schema';
import { AppError } from '@/server/errors';
import { addMember, addStand, makeClub, TEST_NOW, type TestMember } from './make-club';

export const SATURDAY = '2026-11-07';

export function wanted(standId: string, more: Partial<BookSitInput> = {}): BookSitInput {
  const key = { requestKey: randomUUID() };
  return bookSitSchema.parse({ standId, day: SATURDAY, windows: 'morning', weapon: 'bow', ...key, ...more });
}

export const book = (who: TestMember, standId: string, more: Partial<BookSitInput> = {}, now = TEST_NOW) =>
  bookSit(who.scope, wanted(standId, more), now);

/** The AppError a piece of work is refused with; anything else fails the test. */
export async function refusal(work: Promise<unknown>): Promise<AppError> {
  const error = await work.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  if (!(error instanceof AppError)) throw new Error(`Not refused: ${String(error)}`);
  return error;
}

/** What bookings have written for a club. */
export async function bookingRows(clubId: string) {
  return {
    sits: await reader().select().from(sits).where(eq(sits.clubId, clubId)),
    claims: await reader().select().from(claims).where(eq(claims.clubId, clubId)),
    audit: await reader().select().from(auditLog).where(eq(auditLog.clubId, clubId)),
    mail: await reader().select().from(outbox).where(eq(outbox.clubId, clubId)),
  };
}

/** A club with two members and one stand. */
export async function smallClub(rules: Partial<ClubRules> = {}) {
  const club = await makeClub(rules);
  return {
    club,
    ann: await addMember(club, 'member', { name: 'Ann Roe' }),
    bert: await addMember(club, 'member', { name: 'Bert Hale' }),
    oak: await addStand(club, { name: 'Oak Ladder' }),
  };
}
