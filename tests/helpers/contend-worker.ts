import { randomUUID } from 'node:crypto';
import { closeDatabase } from '@/db/client';
import { bookSit } from '@/features/bookings/book-sit';
import { bookSitSchema } from '@/features/bookings/sit-schema';
import { mapError } from '@/server/map-error';
import { findScope } from '@/server/scope';

/** What one process is told: its members try every stand in turn, all at once. */
export interface ContendOrder {
  slug: string;
  userIds: string[];
  standIds: string[];
  day: string;
  attempts: number;
  now: number;
}

/** How many attempts ended in what: 'booked', or the code of the error a person would have seen. */
export type ContendTally = Record<string, number>;

async function attempt(order: ContendOrder, n: number): Promise<string> {
  const { userIds, standIds } = order;
  const scope = await findScope(order.slug, userIds[n % userIds.length] ?? '');
  if (!scope) return 'no scope';
  const standId = standIds[Math.floor(n / userIds.length) % standIds.length];
  const values = { standId, day: order.day, windows: 'morning', weapon: 'bow', requestKey: randomUUID() };
  try {
    await bookSit(scope, bookSitSchema.parse(values), order.now);
    return 'booked';
  } catch (error) {
    return mapError(error, 'contend').code;
  }
}

const order: ContendOrder = JSON.parse(process.argv[2] ?? '{}');
const tally: ContendTally = {};
const ends = await Promise.all(Array.from({ length: order.attempts }, (_, n) => attempt(order, n)));
for (const end of ends) tally[end] = (tally[end] ?? 0) + 1;
await closeDatabase();
process.stdout.write(`${JSON.stringify(tally)}\n`);
