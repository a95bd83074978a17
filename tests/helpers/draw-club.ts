import { DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import { write } from '@/db/client';
import { clubs, memberships, stands, users } from '@/db/schema';
import { newId } from '@/lib/ids';
import { hashPassword } from '@/server/passwords';

export const DRAW_PASSWORD = 'names out of the hat';
export const DRAW_SLUG = 'draw-club';
export const DRAW_PEOPLE = {
  admin: { name: 'Fay Holt', email: 'fay@example.org', role: 'admin' },
  ada: { name: 'Ada Birch', email: 'ada@example.org', role: 'member' },
  ben: { name: 'Ben Alder', email: 'ben@example.org', role: 'member' },
  cal: { name: 'Cal Rowan', email: 'cal@example.org', role: 'member' },
} as const;
export type DrawPerson = keyof typeof DRAW_PEOPLE;

const PLACE = { lat: 34.117, lon: -84 };

/** Creek and Creek Over lie 100 m apart; Ridge alone has a seat for a guest. */
const STANDS = [
  { name: 'Creek', north: 0, seats: 1 },
  { name: 'Creek Over', north: 0.0009, seats: 1 },
  { name: 'Ridge', north: 0.02, seats: 2 },
  { name: 'Hollow', north: 0.04, seats: 1 },
];

/** A club of an admin, three members and four stands, with the rules most clubs post. */
export async function makeDrawClub(now: number): Promise<void> {
  const clubId = newId('club');
  const passwordHash = await hashPassword(DRAW_PASSWORD);
  await write(async (tx) => {
    await tx.insert(clubs).values({
      id: clubId,
      slug: DRAW_SLUG,
      name: 'Draw Club',
      ...PLACE,
      zone: 'America/New_York',
      units: 'us',
      rules: DEFAULT_CLUB_RULES,
      createdAt: now,
    });
    for (const { name, email, role } of Object.values(DRAW_PEOPLE)) {
      const userId = newId('user');
      await tx.insert(users).values({ id: userId, name, email, passwordHash, emailVerifiedAt: now, createdAt: now });
      await tx.insert(memberships).values({ id: newId('membership'), clubId, userId, role, joinedAt: now });
    }
    for (const { name, north, seats } of STANDS) {
      await tx.insert(stands).values({
        id: newId('stand'),
        clubId,
        name,
        seats,
        lat: PLACE.lat + north,
        lon: PLACE.lon,
        kind: 'ladder',
        seatHeightM: 5,
        shotSide: 'either',
        shotRangeM: { bow: 27 },
        shelter: 'open_wood',
        arcs: [{ fromDeg: 0, toDeg: 360, window: null }],
        morning: 'prime',
        evening: 'prime',
        createdAt: now,
      });
    }
  });
}
