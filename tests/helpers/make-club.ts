import { type ClubRules, DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import type { Role } from '@/core/permissions';
import { write } from '@/db/client';
import { clubs, memberships, stands, users } from '@/db/schema';
import { newId } from '@/lib/ids';
import { type ClubScope, findScope } from '@/server/scope';
import { startSession } from '@/server/session';
import { inRequest, newBrowser, type TestRequest } from './request';

/** Centre of the invented club used in tests. */
export const TEST_PLACE = { lat: 34.117, lon: -84, zone: 'America/New_York' };
export const TEST_NOW = Date.UTC(2026, 10, 4, 15);

let count = 0;

export interface TestClub {
  id: string;
  slug: string;
}

export async function makeClub(rules: Partial<ClubRules> = {}): Promise<TestClub> {
  const id = newId('club');
  const slug = `club-${++count}-${id.slice(-6)}`;
  await write((tx) =>
    tx.insert(clubs).values({
      id,
      slug,
      name: `Club ${count}`,
      ...TEST_PLACE,
      units: 'us',
      rules: { ...DEFAULT_CLUB_RULES, ...rules },
      createdAt: TEST_NOW,
    }),
  );
  return { id, slug };
}

export interface TestMember {
  id: string;
  userId: string;
  email: string;
  name: string;
  browser: TestRequest;
  scope: ClubScope;
}

/** A member with an account and a signed-in browser. */
export async function addMember(
  club: TestClub,
  role: Role = 'member',
  more: { name?: string; sponsorId?: string; guestFrom?: string; guestTo?: string } = {},
): Promise<TestMember> {
  const userId = newId('user');
  const id = newId('membership');
  const name = more.name ?? `${role} ${++count}`;
  const email = `${userId}@example.test`;
  await write(async (tx) => {
    await tx.insert(users).values({
      id: userId,
      email,
      name,
      passwordHash: 'no password',
      emailVerifiedAt: TEST_NOW,
      createdAt: TEST_NOW,
    });
    await tx.insert(memberships).values({ id, clubId: club.id, userId, role, joinedAt: TEST_NOW, ...more });
  });
  const browser = newBrowser();
  await inRequest(browser, () => startSession(userId));
  const scope = await findScope(club.slug, userId);
  if (!scope) throw new Error('The member just made cannot enter the club.');
  return { id, userId, email, name, browser, scope };
}

export async function addStand(club: TestClub, more: Partial<typeof stands.$inferInsert> = {}): Promise<string> {
  const id = newId('stand');
  await write((tx) =>
    tx.insert(stands).values({
      id,
      clubId: club.id,
      name: `Stand ${++count}`,
      kind: 'ladder',
      lat: TEST_PLACE.lat + count * 0.004,
      lon: TEST_PLACE.lon,
      seatHeightM: 5,
      facingDeg: 0,
      shotSide: 'either',
      shotRangeM: { bow: 27, rifle: 140 },
      shelter: 'open_wood',
      seats: 1,
      arcs: [{ fromDeg: 270, toDeg: 360, window: null }],
      morning: 'usable',
      evening: 'usable',
      createdAt: TEST_NOW,
      ...more,
    }),
  );
  return id;
}
