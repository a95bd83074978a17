import { DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import { write } from '@/db/client';
import { approaches, clubs, memberships, parkings, stands, users } from '@/db/schema';
import { newId } from '@/lib/ids';
import { hashPassword } from '@/server/passwords';

export const DAY_PASSWORD = 'down by the sycamores';
export const DAY_SLUG = 'day-club';
export const DAY_PEOPLE = {
  member: { name: 'Ann Roe', email: 'ann@example.org', role: 'member' },
  officer: { name: 'Cora Pike', email: 'cora@example.org', role: 'steward' },
  landowner: { name: 'Edna Moss', email: 'edna@example.org', role: 'landowner' },
} as const;

/** Whole hours to add to UTC so that the club's clock stands between nine and ten in the morning. */
function hoursToNine(now: number): number {
  const hours = 9 - new Date(now).getUTCHours();
  return hours < -11 ? hours + 24 : hours;
}

/** A club laid where it is morning now, so that a member's whole day can be lived at any hour of the machine's. */
export async function makeDayClub(now: number): Promise<void> {
  const hours = hoursToNine(now);
  const zone = `Etc/GMT${hours <= 0 ? '+' : '-'}${Math.abs(hours)}`;
  const place = { lat: 34.1, lon: hours * 15 };
  const clubId = newId('club');
  const passwordHash = await hashPassword(DAY_PASSWORD);
  await write(async (tx) => {
    const rules = { ...DEFAULT_CLUB_RULES, restDaysDefault: 0 };
    await tx.insert(clubs).values({
      id: clubId,
      slug: DAY_SLUG,
      name: 'Day Club',
      ...place,
      zone,
      units: 'us',
      rules,
      createdAt: now,
    });
    for (const { name, email, role } of Object.values(DAY_PEOPLE)) {
      const userId = newId('user');
      await tx.insert(users).values({ id: userId, name, email, passwordHash, emailVerifiedAt: now, createdAt: now });
      await tx.insert(memberships).values({ id: newId('membership'), clubId, userId, role, joinedAt: now });
    }
    const parkingId = newId('parking');
    await tx.insert(parkings).values({ id: parkingId, clubId, name: 'North gate', ...place });
    for (const [n, name] of ['Oak Ladder', 'Elm Box'].entries()) {
      const at = { lat: place.lat + 0.01 * (n + 1), lon: place.lon + 0.01 * n };
      const standId = newId('stand');
      await tx.insert(stands).values({
        id: standId,
        clubId,
        name,
        ...at,
        kind: 'ladder',
        seatHeightM: 5,
        shotSide: 'either',
        shotRangeM: { bow: 27 },
        shelter: 'open_wood',
        seats: 1,
        arcs: [{ fromDeg: 0, toDeg: 360, window: null }],
        morning: 'prime',
        evening: 'prime',
        createdAt: now,
      });
      const points = [
        [place.lon, place.lat],
        [at.lon, at.lat],
      ];
      const way = { clubId, standId, parkingId, points, direction: 'both' as const };
      await tx.insert(approaches).values({ ...way, id: newId('approach'), name: `${name} path` });
    }
  });
}
