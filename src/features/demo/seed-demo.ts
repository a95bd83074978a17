import { reader, write } from '@/db/client';
import { hashPassword } from '@/server/passwords';
import { buildDemo } from './build-demo';
import { hasUsersOrClubs, insertDemo } from './data';
import { DEMO_PASSWORD } from './people';

export type SeedResult = 'seeded' | 'not_local' | 'not_empty';

/** Fills an empty local database with the demo club, whole or not at all. */
export async function seedDemo(databaseUrl: string, now: number): Promise<SeedResult> {
  if (!databaseUrl.startsWith('file:')) return 'not_local';
  if (await hasUsersOrClubs(reader())) return 'not_empty';
  const rows = buildDemo(now, await hashPassword(DEMO_PASSWORD));
  return write(async (tx) => {
    if (await hasUsersOrClubs(tx)) return 'not_empty';
    await insertDemo(tx, rows);
    return 'seeded';
  });
}
