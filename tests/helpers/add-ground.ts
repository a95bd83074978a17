import { write } from '@/db/client';
import { approaches, features, parkings } from '@/db/schema';
import { newId } from '@/lib/ids';
import { TEST_PLACE, type TestClub } from './make-club';

/** A parking place some way south of the club's centre, and a way from it to a stand. */
export async function addApproach(
  club: TestClub,
  standId: string,
  to: { lat: number; lon: number },
  name = 'Creek way',
): Promise<string> {
  const parkingId = newId('parking');
  const id = newId('approach');
  const from = { lat: TEST_PLACE.lat - 0.004, lon: TEST_PLACE.lon };
  await write(async (tx) => {
    await tx.insert(parkings).values({ id: parkingId, clubId: club.id, name: `${name} lot`, ...from });
    await tx.insert(approaches).values({
      id,
      clubId: club.id,
      standId,
      parkingId,
      name,
      direction: 'both',
      points: [
        [from.lon, from.lat],
        [to.lon, to.lat],
      ],
    });
  });
  return id;
}

export async function addFeature(
  club: TestClub,
  name: string,
  kind: (typeof features.$inferInsert)['kind'],
  at: { lat: number; lon: number },
): Promise<string> {
  const id = newId('feature');
  await write((tx) =>
    tx.insert(features).values({
      id,
      clubId: club.id,
      name,
      kind,
      geometry: { type: 'Point', coordinates: [at.lon, at.lat] },
      months: [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12],
    }),
  );
  return id;
}
