import { addDays, dayOf, formatDay } from '@/core/day-time';
import type { Tx } from '@/db/client';
import { newId } from '@/lib/ids';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type ClosureValues, insertClosure } from './closures-data';
import { noteChange } from './note-change';
import { type BookedSit, listBookedSits } from './people-data';
import { getStand } from './stands-data';
import { GROUND_AUDIT } from './words/audit';
import { WHOLE_GROUND } from './words/closures';
import { GROUND_ERRORS } from './words/errors';

export interface Closed {
  id: string;
  /** Booked sits the closure falls on: they stay booked until somebody cancels them. */
  touched: BookedSit[];
}

/** What is closed by name: a stand's, or that of the whole ground. */
export async function nameOfGround(scope: ClubScope, tx: Tx, standId: string | null): Promise<string> {
  if (standId === null) return WHOLE_GROUND;
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
  const from = formatDay(values.fromDay, true);
  const to = values.toDay === null ? null : formatDay(values.toDay, true);
  const summary = GROUND_AUDIT.closed(name, from, to, values.reason);
  await noteChange(scope, tx, { subject: 'closure', verb: 'added', id, summary, detail: { ...values } }, now);
  return { id, touched: await listBookedSits(scope, { ...values, now }, tx) };
}

/** A closure that a person may not make, or that tells of no day to come. */
export function refuseClosing(scope: ClubScope, values: ClosureValues, now: number): void {
  if (values.standId !== null && !scope.can('stands.write')) {
    throw new AppError('forbidden', GROUND_ERRORS.onlyStewardCloses);
  }
  const today = dayOf(now, scope.club.zone);
  if (values.toDay !== null && values.toDay < today) {
    const message = GROUND_ERRORS.daysPast;
    throw new AppError('invalid', message, { fields: { toDay: message } });
  }
  // A closure tells of days to come; one that began long ago would only rewrite the record.
  if (values.fromDay < addDays(today, -366)) {
    const message = GROUND_ERRORS.firstDayOld;
    throw new AppError('invalid', message, { fields: { fromDay: message } });
  }
}
