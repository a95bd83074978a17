import { write } from '@/db/client';
import { type Closed, closeGroundIn, nameOfGround, refuseClosing } from '@/features/ground/close-ground';
import type { ClosureValues } from '@/features/ground/closures-data';
import type { ClubScope } from '@/server/scope';
import { queueClosureMails } from './closure-mails';

/**
 * Closes a stand, or with no stand the whole ground, and tells those whose booked sits it falls on, and the officers. A stand
 * may stay closed until somebody opens it again.
 */
export async function closeDays(scope: ClubScope, values: ClosureValues, now: number): Promise<Closed> {
  refuseClosing(scope, values, now);
  return write(async (tx) => {
    const name = await nameOfGround(scope, tx, values.standId);
    const closed = await closeGroundIn(tx, scope, values, name, now);
    await queueClosureMails(tx, scope, { ...values, id: closed.id, name }, now);
    return closed;
  });
}
