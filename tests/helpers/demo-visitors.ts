import { eq } from 'drizzle-orm';
import { reader, write } from '@/db/client';
import * as schema from '@/db/schema';
import { DEMO_SLUG } from '@/features/demo/build-demo';
import { seedDemo } from '@/features/demo/seed-demo';
import { keepFilesIn, photoKey } from '@/features/photos/files';
import { refreshAllForecasts } from '@/features/weather/refresh-all';
import { setClock } from '@/server/clock';
import { startSession } from '@/server/session';
import { makeMemoryFiles } from './memory-files';
import { inRequest, newBrowser, type TestRequest } from './request';

export const DEMO_NOW = Date.UTC(2026, 10, 4, 15);

/** Everybody who may stand before a door of the demo club. */
export const VISITORS = {
  admin: 'nora',
  steward: 'abel',
  member: 'odalys',
  guest: 'perry',
  landowner: 'edith',
  'removed member': 'dell',
  'guest past the last day': 'hollis',
  'admin of another club': 'bram',
  stranger: 'stranger',
  'signed out': null,
} as const;
export type Visitor = keyof typeof VISITORS;

export interface DemoVisitors {
  slug: string;
  browsers: Record<Visitor, TestRequest>;
  /** A real thing of the demo for each part of an address. */
  params: Record<string, string>;
}

async function signIn(key: string): Promise<TestRequest> {
  const [user] = await reader()
    .select()
    .from(schema.users)
    .where(eq(schema.users.email, `${key}@example.org`));
  if (!user) throw new Error(`The demo has nobody called ${key}.`);
  const browser = newBrowser();
  await inRequest(browser, () => startSession(user.id));
  return browser;
}

async function changeMembership(key: string, set: Partial<typeof schema.memberships.$inferInsert>): Promise<void> {
  const [row] = await reader()
    .select({ id: schema.memberships.id })
    .from(schema.memberships)
    .innerJoin(schema.users, eq(schema.users.id, schema.memberships.userId))
    .where(eq(schema.users.email, `${key}@example.org`));
  await write((tx) =>
    tx
      .update(schema.memberships)
      .set(set)
      .where(eq(schema.memberships.id, row?.id ?? '')),
  );
}

async function realParams(): Promise<Record<string, string>> {
  const from = reader();
  const [club] = await from.select().from(schema.clubs).where(eq(schema.clubs.slug, DEMO_SLUG));
  const [approach] = await from.select().from(schema.approaches).limit(1);
  const [feature] = await from.select().from(schema.features).limit(1);
  const [parking] = await from.select().from(schema.parkings).limit(1);
  const [member] = await from
    .select()
    .from(schema.memberships)
    .where(eq(schema.memberships.clubId, club?.id ?? ''));
  const [log] = await from.select().from(schema.sitLogs).limit(1);
  const [harvest] = await from.select().from(schema.harvests).limit(1);
  const [chore] = await from.select().from(schema.chores).limit(1);
  const [workDay] = await from.select().from(schema.workDays).limit(1);
  const [draw] = await from.select().from(schema.draws).limit(1);
  const [imported] = await from.select().from(schema.imports).limit(1);
  return {
    club: DEMO_SLUG,
    import: imported?.id ?? '',
    stand: approach?.standId ?? '',
    approach: approach?.id ?? '',
    feature: feature?.id ?? '',
    parking: parking?.id ?? '',
    member: member?.id ?? '',
    sit: log?.sitId ?? '',
    harvest: harvest?.id ?? '',
    chore: chore?.id ?? '',
    workday: workDay?.id ?? '',
    draw: draw?.id ?? '',
    id: 'none',
    token: 'none',
    secret: 'none.ics',
  };
}

/** A photo of a stand of the demo, in files of this process's own. */
async function addPhoto({ stand, member }: Record<string, string>): Promise<string> {
  const [club] = await reader().select().from(schema.clubs).where(eq(schema.clubs.slug, DEMO_SLUG));
  const files = makeMemoryFiles();
  keepFilesIn(files);
  const [id, clubId] = ['pho_demo', club?.id ?? ''];
  for (const size of ['full', 'thumb'] as const)
    await files.put(photoKey(clubId, id, size), Uint8Array.of(1), 'image/jpeg');
  const subject = { subjectType: 'stand' as const, subjectId: stand ?? '' };
  const facts = { width: 4, height: 3, bytes: 1, byMemberId: member ?? '', createdAt: DEMO_NOW };
  await write((tx) => tx.insert(schema.photos).values({ id, clubId, ...subject, ...facts }));
  return id;
}

/** The demo club at a fixed hour, with a signed-in browser for each kind of visitor. */
export async function openDemo(): Promise<DemoVisitors> {
  setClock(() => DEMO_NOW);
  await seedDemo('file:demo.db', DEMO_NOW);
  await refreshAllForecasts(DEMO_NOW);
  await write((tx) =>
    tx.insert(schema.users).values({
      id: 'usr_stranger',
      email: 'stranger@example.org',
      name: 'Somebody Else',
      passwordHash: 'none',
      emailVerifiedAt: DEMO_NOW,
      createdAt: DEMO_NOW,
    }),
  );
  const lastWeek = { guestFrom: '2026-10-20', guestTo: '2026-11-03' };
  await changeMembership('hollis', { role: 'guest', ...lastWeek });
  await changeMembership('dell', { removedAt: DEMO_NOW - 86_400_000 });
  const params = await realParams();
  const photo = await addPhoto(params);
  const signedIn = async (key: string | null) => (key === null ? newBrowser() : signIn(key));
  return {
    slug: DEMO_SLUG,
    browsers: {
      admin: await signedIn(VISITORS.admin),
      steward: await signedIn(VISITORS.steward),
      member: await signedIn(VISITORS.member),
      guest: await signedIn(VISITORS.guest),
      landowner: await signedIn(VISITORS.landowner),
      'removed member': await signedIn(VISITORS['removed member']),
      'guest past the last day': await signedIn(VISITORS['guest past the last day']),
      'admin of another club': await signedIn(VISITORS['admin of another club']),
      stranger: await signedIn(VISITORS.stranger),
      'signed out': await signedIn(VISITORS['signed out']),
    },
    params: { ...params, photo },
  };
}
