import { can } from '@/core/permissions';
import { type Tx, write } from '@/db/client';
import { changedSince } from '@/features/ground/refuse';
import { resolvePlace } from '@/features/logs/visit-places';
import { newId } from '@/lib/ids';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { ChoreInput } from './chore-schema';
import { findChore, insertChore, listPeople, updateChore } from './chores-data';
import { noteUpkeep } from './note-upkeep';
import { BY_POSITION, CHORE_AUDIT, CHORE_ERRORS } from './words/chores';

const wrong = (field: string, message: string) => new AppError('invalid', message, { fields: { [field]: message } });

async function valuesOf(scope: ClubScope, tx: Tx, input: ChoreInput) {
  const { title, notes, assigneeId, dueOn } = input;
  if (assigneeId !== null) {
    const person = (await listPeople(scope, tx)).find(({ id }) => id === assigneeId);
    if (!person || !can(person.role, 'chores.read')) {
      throw wrong('assigneeId', CHORE_ERRORS.assignee);
    }
  }
  if (input.place === null) {
    return { title, notes, assigneeId, dueOn, place: '', placeName: '', lat: null, lon: null };
  }
  const found = await resolvePlace(scope, input.place, tx);
  if (!found) throw wrong('place', CHORE_ERRORS.placeGone);
  const point = input.place.of === 'point';
  const place = input.place.of === 'point' ? 'point' : `${input.place.of}:${input.place.id}`;
  const placeName = point ? BY_POSITION : found.name;
  return { title, notes, assigneeId, dueOn, place, placeName, lat: found.lat, lon: found.lon };
}

/** Adds a chore inside a change of which it is a part. */
export async function addChoreIn(tx: Tx, scope: ClubScope, input: ChoreInput, now: number): Promise<{ id: string }> {
  const id = newId('chore');
  const values = await valuesOf(scope, tx, input);
  await insertChore(tx, { ...values, id, clubId: scope.club.id, createdBy: scope.member.id, createdAt: now });
  await noteUpkeep(scope, tx, { subject: 'chore', verb: 'added', id, summary: CHORE_AUDIT.added(values.title) }, now);
  return { id };
}

export function addChore(scope: ClubScope, input: ChoreInput, now: number): Promise<{ id: string }> {
  return write((tx) => addChoreIn(tx, scope, input, now));
}

export async function changeChore(
  scope: ClubScope,
  at: { id: string; version: number },
  input: ChoreInput,
  now: number,
): Promise<{ id: string }> {
  return write(async (tx) => {
    const chore = await findChore(scope, at.id, tx);
    if (!chore) throw notFound();
    if (chore.doneOn !== null) throw new AppError('conflict', CHORE_ERRORS.done);
    if (!(await updateChore(scope, tx, at, await valuesOf(scope, tx, input)))) {
      throw await changedSince(scope, { id: chore.id, name: chore.title }, tx);
    }
    const summary = CHORE_AUDIT.changed(input.title);
    await noteUpkeep(scope, tx, { subject: 'chore', verb: 'changed', id: at.id, summary }, now);
    return { id: at.id };
  });
}

/** Takes an open chore that nobody has. */
export async function takeChore(scope: ClubScope, id: string, now: number): Promise<{ id: string; title: string }> {
  return write(async (tx) => {
    const chore = await findChore(scope, id, tx);
    if (!chore) throw notFound();
    const { title, version } = chore;
    if (chore.assigneeId === scope.member.id) return { id, title };
    if (chore.doneOn !== null) throw new AppError('conflict', CHORE_ERRORS.doneAlready);
    if (chore.assigneeId !== null) {
      throw new AppError('conflict', CHORE_ERRORS.taken(chore.assigneeName));
    }
    await updateChore(scope, tx, { id, version }, { assigneeId: scope.member.id });
    const summary = CHORE_AUDIT.taken(scope.member.name, title);
    await noteUpkeep(scope, tx, { subject: 'chore', verb: 'taken', id, summary }, now);
    return { id, title };
  });
}

export async function removeChore(scope: ClubScope, id: string, now: number): Promise<{ id: string }> {
  return write(async (tx) => {
    const chore = await findChore(scope, id, tx);
    if (!chore) throw notFound();
    if (chore.doneOn !== null) throw new AppError('conflict', CHORE_ERRORS.hoursStay);
    await updateChore(scope, tx, chore, { removedAt: now });
    const summary = CHORE_AUDIT.removed(chore.title);
    await noteUpkeep(scope, tx, { subject: 'chore', verb: 'removed', id, summary }, now);
    return { id };
  });
}
