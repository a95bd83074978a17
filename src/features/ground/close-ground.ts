import { addDays, dayOf, formatDay } from '@/core/day-time';
import type { Tx } from '@/db/client';
import { newId } from '@/lib/ids';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type ClosureValues, insertClosure } from './closures-data';
import { noteChange } from './note-change';
import { type BookedSit, listBookedSits } from './people-data';
import { getStand } from './stands-data';

export interface Closed {
  id: string;
  /** Booked sits the closure falls on: they stay booked until somebody cancels them. */
  touched: BookedSit[];
}

/** What is closed by name: a stand's, or that of the whole ground. */
export async function nameOfGround(scope: ClubScope, tx: Tx, standId: string | null): Promise<string> {
  if (standId === null) return 'the whole ground';
  const stand = await getStand(scope, standId, tx);
  if (!stand) throw notFound();
  return stand.name;
}

/** Closes ground inside a change of which it is a part; `name` is what it is called. */
export async function closeGroundIn(
  tx: Tx,
  scope: ClubScope,
  values: ClosureValues,
  name: string,
  now: number,
): Promise<Closed> {
  const id = newId('closure');
  await insertClosure(scope, tx, { ...values, id, createdAt: now });
  const until = values.toDay === null ? 'until opened again' : `to ${formatDay(values.toDay, true)}`;
  const summary = `Closed ${name} from ${formatDay(values.fromDay, true)} ${until}: ${values.reason}`;
  await noteChange(scope, tx, { subject: 'closure', verb: 'added', id, summary, detail: { ...values } }, now);
  return { id, touched: await listBookedSits(scope, { ...values, now }, tx) };
}

/** A closure that a person may not make, or that tells of no day to come. */
export function refuseClosing(scope: ClubScope, values: ClosureValues, now: number): void {
  if (values.standId !== null && !scope.can('stands.write')) {
    throw new AppError('forbidden', 'Only a steward or an admin closes a stand; you may close the whole ground.');
  }
  const today = dayOf(now, scope.club.zone);
  if (values.toDay !== null && values.toDay < today) {
    const message = 'These days are past: choose a last day from today on.';
    throw new AppError('invalid', message, { fields: { toDay: message } });
  }
  // A closure tells of days to come; one that began long ago would only rewrite the record.
  if (values.fromDay < addDays(today, -366)) {
    const message = 'Choose a first day within the last year.';
    throw new AppError('invalid', message, { fields: { fromDay: message } });
  }
}
