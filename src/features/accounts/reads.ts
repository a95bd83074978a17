import { formatDistance } from 'date-fns';
import { dayOf } from '@/core/day-time';
import type { Units } from '@/core/units';
import { listClubsOf } from '@/db/queries/memberships';
import { listSessions } from '@/db/queries/sessions';
import { hashSecret } from '@/lib/secrets';
import type { CurrentUser } from '@/server/session';
import { browserName } from './browser-name';
import { findTokenOwner, findUserById, type TokenPurpose } from './data';

/** How figures are shown to this person: their own choice, or as each club has it. */
export async function readMyUnits(user: Pick<CurrentUser, 'id'>): Promise<Units | 'club'> {
  return (await findUserById(user.id))?.units ?? 'club';
}

/** The person's signed-in browsers, newest first. The id is the stored hash, no key to anything. */
export async function listMySessions(user: CurrentUser, now: number) {
  const here = hashSecret(user.sessionId);
  const rows = await listSessions(user.id, now);
  return rows.map((row) => ({
    id: row.id,
    browser: browserName(row.userAgent),
    address: row.address,
    since: formatDistance(row.createdAt, now, { addSuffix: true }),
    here: row.id === here,
  }));
}

export type SessionView = Awaited<ReturnType<typeof listMySessions>>[number];

/** The clubs a person may enter today: a guest's ends with its last day. */
export async function listMyClubs(userId: string, now: number) {
  const clubs = await listClubsOf(userId);
  return clubs.filter(({ role, guestTo, zone }) => role !== 'guest' || guestTo === null || dayOf(now, zone) <= guestTo);
}

/** Whose link this is, without using it up; null when it is spent, too old or made up. */
export async function peekLink(token: string | undefined, purpose: TokenPurpose, now: number) {
  const user = token ? await findTokenOwner(hashSecret(token), purpose, now) : null;
  return user && { name: user.name, email: user.email };
}
