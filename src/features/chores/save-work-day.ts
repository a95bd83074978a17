import { addDays, dayOf, formatDay, localToUtc } from '@/core/day-time';
import { can } from '@/core/permissions';
import { type Tx, write } from '@/db/client';
import { changedSince } from '@/features/ground/refuse';
import { newId } from '@/lib/ids';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { listPeople } from './chores-data';
import { noteUpkeep } from './note-upkeep';
import { WORK_DAY_AUDIT, WORK_DAY_ERRORS } from './words/work-days';
import type { CreditInput, WorkDayInput } from './work-day-schema';
import {
  deleteComing,
  findWorkDay,
  insertWorkDay,
  listComing,
  putComing,
  updateWorkDay,
  type WorkDayRow,
} from './work-days-data';

function valuesOf(scope: ClubScope, input: WorkDayInput, now: number) {
  const { title, day, startClock, endClock, meet, notes } = input;
  const { zone } = scope.club;
  const today = dayOf(now, zone);
  if (day < addDays(today, -366) || day > addDays(today, 731)) {
    const message = WORK_DAY_ERRORS.day;
    throw new AppError('invalid', message, { fields: { day: message } });
  }
  return {
    title,
    day,
    startAt: localToUtc(day, startClock, zone),
    endAt: localToUtc(day, endClock, zone),
    meet,
    notes,
    updatedAt: now,
  };
}

async function need(scope: ClubScope, tx: Tx, id: string): Promise<WorkDayRow> {
  const row = await findWorkDay(scope, id, tx);
  if (!row) throw notFound();
  if (row.cancelledAt !== null) throw new AppError('conflict', WORK_DAY_ERRORS.calledOff);
  return row;
}

const named = (row: Pick<WorkDayRow, 'title' | 'day'>) => `${row.title}, ${formatDay(row.day, true)}`;

export async function addWorkDay(scope: ClubScope, input: WorkDayInput, now: number): Promise<{ id: string }> {
  const values = valuesOf(scope, input, now);
  return write(async (tx) => {
    const id = newId('workDay');
    await insertWorkDay(tx, { ...values, id, clubId: scope.club.id, createdAt: now });
    const summary = WORK_DAY_AUDIT.set(named(values));
    await noteUpkeep(scope, tx, { subject: 'work_day', verb: 'added', id, summary }, now);
    return { id };
  });
}

export async function changeWorkDay(
  scope: ClubScope,
  input: WorkDayInput & { id: string; sequence: number },
  now: number,
): Promise<{ id: string }> {
  const values = valuesOf(scope, input, now);
  return write(async (tx) => {
    const row = await need(scope, tx, input.id);
    if (row.sequence !== input.sequence) throw await changedSince(scope, { id: row.id, name: row.title }, tx);
    await updateWorkDay(scope, tx, row.id, { ...values, sequence: row.sequence + 1 });
    const summary = WORK_DAY_AUDIT.changed(named(row), named(values));
    await noteUpkeep(scope, tx, { subject: 'work_day', verb: 'changed', id: row.id, summary }, now);
    return { id: row.id };
  });
}

/** Calls a work day off; calendars see it cancelled. */
export async function cancelWorkDay(scope: ClubScope, id: string, now: number): Promise<{ id: string }> {
  return write(async (tx) => {
    const row = await findWorkDay(scope, id, tx);
    if (!row) throw notFound();
    if (row.cancelledAt !== null) return { id };
    await updateWorkDay(scope, tx, id, { cancelledAt: now, updatedAt: now, sequence: row.sequence + 1 });
    await noteUpkeep(
      scope,
      tx,
      { subject: 'work_day', verb: 'cancelled', id, summary: WORK_DAY_AUDIT.calledOff(named(row)) },
      now,
    );
    return { id };
  });
}

/** Says that one comes, or does not after all. */
export async function joinWorkDay(
  scope: ClubScope,
  input: { id: string; comes: boolean },
  now: number,
): Promise<{ comes: boolean }> {
  return write(async (tx) => {
    const row = await need(scope, tx, input.id);
    if (row.endAt <= now) throw new AppError('conflict', WORK_DAY_ERRORS.over);
    const memberId = scope.member.id;
    if (input.comes) {
      await putComing(tx, { clubId: scope.club.id, workDayId: row.id, memberId, hours: null, at: now });
    } else {
      await deleteComing(scope, tx, row.id, memberId);
    }
    return { comes: input.comes };
  });
}

/** Credits the hours of a work day; a blank takes the person off it. */
export async function creditWorkDay(scope: ClubScope, input: CreditInput, now: number): Promise<{ credited: number }> {
  return write(async (tx) => {
    const row = await need(scope, tx, input.id);
    if (row.startAt > now) throw new AppError('conflict', WORK_DAY_ERRORS.toCome);
    const workers = (await listPeople(scope, tx)).filter(({ role }) => can(role, 'chores.read'));
    const before = (await listComing(scope, tx)).filter(({ workDayId }) => workDayId === row.id);
    let credited = 0;
    for (const { memberId, hours } of input.members) {
      if (!workers.some(({ id }) => id === memberId)) {
        throw new AppError('invalid', WORK_DAY_ERRORS.noMember);
      }
      if (hours === null) {
        if (before.some((one) => one.memberId === memberId)) await deleteComing(scope, tx, row.id, memberId);
        continue;
      }
      await putComing(tx, { clubId: scope.club.id, workDayId: row.id, memberId, hours, at: now });
      credited += 1;
    }
    const summary = WORK_DAY_AUDIT.credited(named(row), credited);
    await noteUpkeep(
      scope,
      tx,
      { subject: 'work_day', verb: 'credited', id: row.id, summary, detail: { ...input } },
      now,
    );
    return { credited };
  });
}
