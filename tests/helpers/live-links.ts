import { eq } from 'drizzle-orm';
import { closeDatabase, useDatabase as openDatabase, reader, write } from '@/db/client';
import {
  clubs,
  invitations,
  memberships,
  noticeLinks,
  outings,
  safetyContacts,
  sitLinks,
  tokens,
  users,
} from '@/db/schema';
import { newId } from '@/lib/ids';
import { hashSecret, newSecret } from '@/lib/secrets';

const DAY_MS = 24 * 3_600_000;

async function demoClub() {
  const [found] = await reader()
    .select({ clubId: clubs.id, memberId: memberships.id, userId: users.id })
    .from(memberships)
    .innerJoin(clubs, eq(clubs.id, memberships.clubId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(clubs.slug, 'tansy-fork'))
    .orderBy(users.email)
    .limit(1);
  const [outing] = await reader().select({ id: outings.id }).from(outings).orderBy(outings.id).limit(1);
  if (!found || !outing) throw new Error('The demo club has no member or no outing.');
  return { ...found, outingId: outing.id };
}

/** Links that were mailed and still work, written into the demo's database: the page's path to its address. */
export async function makeLiveLinks(databaseUrl: string, now: number): Promise<Record<string, string>> {
  await openDatabase(databaseUrl);
  const { clubId, memberId, userId, outingId } = await demoClub();
  const secrets = new Map<string, string>();
  const secretFor = (page: string) => {
    const secret = newSecret();
    secrets.set(page, secret);
    return hashSecret(secret);
  };
  const span = { createdAt: now, expiresAt: now + DAY_MS };
  await write(async (tx) => {
    for (const [page, purpose] of [
      ['/reset/[token]', 'reset_password'],
      ['/verify/[token]', 'verify_email'],
    ] as const) {
      await tx.insert(tokens).values({ id: newId('token'), purpose, tokenHash: secretFor(page), userId, ...span });
    }
    await tx.insert(invitations).values({
      id: newId('invitation'),
      clubId,
      name: 'Dora Finch',
      email: 'dora@example.org',
      role: 'member',
      tokenHash: secretFor('/invite/[token]'),
      invitedBy: memberId,
      sentAt: now,
      ...span,
    });
    const linkHash = secretFor('/overdue/[token]');
    await tx
      .insert(sitLinks)
      .values({ id: newId('sitLink'), clubId, outingId, kind: 'shared', secretHash: linkHash, ...span });
    await tx.delete(safetyContacts).where(eq(safetyContacts.userId, userId));
    await tx.insert(safetyContacts).values({
      userId,
      name: 'Dora Finch',
      email: 'dora@example.org',
      secretHash: secretFor('/contact/[token]'),
      askedAt: now,
      expiresAt: now + DAY_MS,
    });
    const noticeHash = secretFor('/unsubscribe/[token]');
    await tx
      .insert(noticeLinks)
      .values({ clubId, memberId, kind: 'wind_turned', secretHash: noticeHash, createdAt: now });
  });
  await closeDatabase();
  return Object.fromEntries([...secrets].map(([page, secret]) => [page, page.replace('[token]', secret)]));
}
