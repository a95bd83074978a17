import { huntingYear } from '@/core/booking/hunting-year';
import { formatDay } from '@/core/day-time';
import { metText, quotaStates } from '@/core/harvest/quotas';
import { type Tx, write } from '@/db/client';
import { changedSince, changes } from '@/features/ground/refuse';
import { newId } from '@/lib/ids';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { checkSheet, type SheetValues } from './check-sheet';
import { deerKind } from './deer-kind';
import { mayChange } from './harvest-access';
import type { HarvestInput } from './harvest-schema';
import { findSheet, findSheetByRequest, insertSheet, listCounted, type Sheet, updateSheet } from './harvests-data';
import { DEER_KIND_WORDS } from './words/deer';
import { HARVEST_AUDIT, HARVEST_ERRORS, SHEET_WORDS } from './words/sheet';

export interface SavedHarvest {
  id: string;
  name: string;
  /** Quotas that are met with it, in words. */
  met: string[];
}

const nameOf = (deer: Pick<SheetValues, 'sex' | 'antlered' | 'day'>) =>
  `${DEER_KIND_WORDS[deerKind(deer)]}, ${formatDay(deer.day, true)}`;

async function saved(scope: ClubScope, tx: Tx, id: string, sheet: SheetValues): Promise<SavedHarvest> {
  const taken = await listCounted(scope, huntingYear(sheet.day), tx);
  const states = quotaStates(scope.club.rules.harvestQuotas, taken, sheet.memberId).filter((state) => state.met);
  const own = sheet.memberId === scope.member.id;
  const met = states.filter(({ quota }) => own || quota.per === 'club').map((state) => metText(state, 'own'));
  return { id, name: nameOf(sheet), met };
}

function note(
  scope: ClubScope,
  tx: Tx,
  entry: { verb: string; id: string; summary: string; detail?: object },
  now: number,
) {
  return audit(
    tx,
    {
      clubId: scope.club.id,
      actor: scope.actor,
      action: `harvest.${entry.verb}`,
      subjectType: 'harvest',
      subjectId: entry.id,
      summary: entry.summary,
      ...(entry.detail ? { detail: { ...entry.detail } } : {}),
    },
    now,
  );
}

/** Writes a harvest sheet. The same request key a second time gives the sheet the first made. */
export async function addHarvest(scope: ClubScope, input: HarvestInput, now: number): Promise<SavedHarvest> {
  return write(async (tx) => {
    const before = await findSheetByRequest(scope, input.requestKey, tx);
    if (before) {
      if (before.sheet.writtenBy === scope.member.id) return saved(scope, tx, before.sheet.id, before.sheet);
      throw new AppError('conflict', HARVEST_ERRORS.sentBefore);
    }
    const { values, hunterName } = await checkSheet(scope, tx, input, null, now);
    const id = newId('harvest');
    const { requestKey } = input;
    await insertSheet(tx, {
      ...values,
      id,
      requestKey,
      clubId: scope.club.id,
      writtenBy: scope.member.id,
      createdAt: now,
    });
    const summary = HARVEST_AUDIT.added(hunterName, nameOf(values));
    await note(scope, tx, { verb: 'added', id, summary, detail: values }, now);
    return saved(scope, tx, id, values);
  });
}

async function findChangeable(scope: ClubScope, tx: Tx, id: string): Promise<Sheet> {
  const found = await findSheet(scope, id, tx);
  if (!found) throw notFound();
  if (mayChange(scope, found)) return found;
  throw new AppError('forbidden', HARVEST_ERRORS.othersCount(found.memberName));
}

/** Changes a sheet; the audit row keeps what each changed field said before. */
export async function changeHarvest(
  scope: ClubScope,
  at: { id: string; version: number },
  input: HarvestInput,
  now: number,
): Promise<SavedHarvest> {
  return write(async (tx) => {
    const { sheet } = await findChangeable(scope, tx, at.id);
    const { values, hunterName } = await checkSheet(scope, tx, input, sheet, now);
    if (!(await updateSheet(scope, tx, at, values))) {
      throw await changedSince(scope, { id: at.id, name: SHEET_WORDS.thisSheet }, tx);
    }
    const summary = HARVEST_AUDIT.changed(hunterName, nameOf(values));
    await note(scope, tx, { verb: 'changed', id: at.id, summary, detail: changes(sheet, values) }, now);
    return saved(scope, tx, at.id, values);
  });
}

/** Takes a sheet out of the counts; its row stays. */
export async function removeHarvest(
  scope: ClubScope,
  at: { id: string; version: number },
  now: number,
): Promise<{ name: string }> {
  return write(async (tx) => {
    const { sheet, memberName } = await findChangeable(scope, tx, at.id);
    if (!(await updateSheet(scope, tx, at, { removedAt: now }))) {
      throw await changedSince(scope, { id: at.id, name: SHEET_WORDS.thisSheet }, tx);
    }
    const name = nameOf(sheet);
    const summary = HARVEST_AUDIT.removed(name, memberName);
    await note(scope, tx, { verb: 'removed', id: at.id, summary }, now);
    return { name };
  });
}
