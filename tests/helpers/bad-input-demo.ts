import { eq, ne } from 'drizzle-orm';
import fc from 'fast-check';
import { expect } from 'vitest';
import { reader, write } from '@/db/client';
import * as schema from '@/db/schema';
import { DEMO_PASSWORD } from '@/features/demo/people';
import { hashSecret } from '@/lib/secrets';
import type { ErrorBody } from '@/server/errors';
import type { Pools } from './bad-bodies';
import { DEMO_NOW, type DemoVisitors, openDemo } from './demo-visitors';
import { newBrowser, type TestRequest } from './request';
import { keepDatabase, type SnapshotDatabase } from './snapshot-database';

/** What a person may be told of a bad body; 'internal' would be our own mistake. */
const PLAIN = ['invalid', 'not_found', 'conflict', 'limit', 'forbidden'];
/** Words of the tools, not of people. */
const NOT_PLAIN = /undefined|\[object|expected|received|SQLITE|Zod/;
/** What the person typed may be said back, in quotes. */
const SAID_BACK = /".*"/gs;

/** Of the invitation, the reset and the confirmation that are waiting. */
const LINK_SECRET = 'a'.repeat(32);

async function idsOf(table: typeof schema.stands | typeof schema.features | typeof schema.sits): Promise<string[]> {
  return (await reader().select({ id: table.id }).from(table).limit(3)).map(({ id }) => id);
}

async function readPools(demo: DemoVisitors): Promise<Pools> {
  const [club] = await reader().select().from(schema.clubs).where(eq(schema.clubs.slug, demo.slug));
  const foreign = ne(schema.stands.clubId, club?.id ?? '');
  const otherStands = (await reader().select().from(schema.stands).where(foreign)).map(({ id }) => id);
  const members = (await reader().select().from(schema.memberships)).map(({ id }) => id);
  const { stand, approach, feature, parking } = demo.params;
  const sits = await idsOf(schema.sits);
  const ids = [stand, approach, feature, parking, ...sits, ...otherStands, ...members.slice(-2), 'std_nowhere'];
  // The first that fits the name of a field gives its values.
  return [
    [/standId/i, [...(await idsOf(schema.stands)), ...otherStands, '', 'std_nowhere']],
    [/sitId/i, [...sits, 'sit_nowhere']],
    [/approachId/i, [approach, '', null, 'app_nowhere']],
    [/parkingId/i, [parking, '', 'prk_nowhere']],
    [/(member|sponsor)Ids?$/i, [...members.slice(0, 4), ...members.slice(-2), '']],
    [/^ids?$|Id$/, ids],
    [/requestKey/, ['7d1e1a52-6a43-4a8e-9a11-0c5d9f3a2b10']],
    [/version/, [1, 1, 1, 1, 0, 2]],
    [/sequence/, [0, 0, 0, 1]],
    [/months/, ['9', '10', '11']],
    [/day$|^from$|^to$|statedOn|guestFrom|guestTo/i, ['2026-11-05', '2026-11-18', '2027-01-15', '2026-10-01']],
    [/clock|morningEnd|eveningStart/i, ['11:00', '14:30']],
    [/zone/, ['America/New_York', 'Etc/UTC']],
    [/email/, ['nora@example.org', 'new@example.test']],
    [/password|current/, [DEMO_PASSWORD, 'another walk in the rain', 'short']],
    [/token/, [LINK_SECRET, LINK_SECRET, 'b'.repeat(32)]],
    [/slug/, ['new-club', demo.slug]],
    [/^lat$/, ['41.118', '41.12', '-80']],
    [/^lon$/, ['-77.286', '-77.29', '12']],
    [/points|places/, ['41.118, -77.286\n41.119, -77.285\n41.12, -77.286', '41.118, -77.286']],
    [/arcs/i, ['NW-N', '270-10', '']],
    [/facing|drain/i, ['', 'N', '135']],
    [/name/i, ['North', 'Old oak', 'Deer, all seasons']],
    [/notes?|reason|text|source|next/i, ['', 'As the steward says.']],
  ];
}

/** Links on their way by mail, so that bad bodies reach what lies behind a good one. */
async function sendLinks(demo: DemoVisitors): Promise<void> {
  const [club] = await reader().select().from(schema.clubs).where(eq(schema.clubs.slug, demo.slug));
  const [user] = await reader().select().from(schema.users).where(eq(schema.users.email, 'odalys@example.org'));
  const [clubId, userId] = [club?.id ?? '', user?.id ?? ''];
  const tokenHash = hashSecret(LINK_SECRET);
  const life = { createdAt: DEMO_NOW, expiresAt: DEMO_NOW + 86_400_000 };
  await write(async (tx) => {
    const invited = { email: 'invited@example.test', name: 'New Hand', role: 'member' as const, invitedBy: userId };
    await tx
      .insert(schema.invitations)
      .values({ id: 'inv_a', clubId, tokenHash, ...invited, ...life, sentAt: DEMO_NOW });
    await tx.insert(schema.tokens).values({ id: 'tok_a', purpose: 'reset_password', tokenHash, userId, ...life });
  });
}

export function expectPlain(error: ErrorBody): void {
  expect(PLAIN).toContain(error.code);
  for (const message of [error.message, ...Object.values(error.fields ?? {})]) {
    expect(message.length).toBeGreaterThan(0);
    expect(message.replace(SAID_BACK, '')).not.toMatch(NOT_PLAIN);
  }
}

export interface BadInputDemo {
  demo: DemoVisitors;
  kept: SnapshotDatabase;
  pools: Pools;
  /** The admin's browser as it was: an action may end the session or start another. */
  admin(): TestRequest;
  /** Starts again from the database as it was at first. */
  restart(): Promise<void>;
  /** Fails when a refused call has left anything behind. */
  afterRefusal(): Promise<void>;
}

/** The demo with links under way and its database kept, so that each call meets the same. */
export async function openBadInputDemo(): Promise<BadInputDemo> {
  const demo = await openDemo();
  await sendLinks(demo);
  const list = await reader().all<{ file: string }>('PRAGMA database_list');
  const kept = await keepDatabase(`file:${list[0]?.file}`);
  await kept.reset();
  const digest = await kept.digest();
  const pools = await readPools(demo);
  let version = await kept.version();
  return {
    demo,
    kept,
    pools,
    admin: () => ({ ...newBrowser(), cookies: new Map(demo.browsers.admin.cookies) }),
    async restart() {
      await kept.reset();
      version = await kept.version();
    },
    async afterRefusal() {
      const now = await kept.version();
      if (now === version) return;
      version = now;
      expect(await kept.digest()).toBe(digest);
    },
  };
}

/** Names the input that a failure came of. */
export async function tellFailure<T>(body: unknown, work: () => Promise<T>): Promise<T> {
  return work().catch((error: unknown) => {
    throw new Error(`With ${fc.stringify(body).slice(0, 600)}: ${error instanceof Error ? error.message : error}`);
  });
}
