import type { Permission } from '@/core/permissions';
import { type Tx, write } from '@/db/client';
import { loadGround } from '@/features/ground/data';
import { noteChange } from '@/features/ground/note-change';
import type { NewKind } from '@/features/map/drawing/kinds';
import { parkingThing, standThing } from '@/features/map/shape-things';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { SaveImport } from './exchange-schema';
import { getImport, type ImportRow, updateImport } from './imports-data';
import { type Taken, Taking } from './insert-thing';
import { fitsShape, kindLabel, kindOf } from './kind-values';
import { checkRow, shapeOf } from './review';
import { IMPORT_AUDIT, IMPORT_ERRORS } from './words/import';

const NEEDS: Record<NewKind['kind'], Permission> = {
  stand: 'stands.write',
  parking: 'features.write',
  approach: 'approaches.write',
  feature: 'features.write',
  item: 'features.write',
};
const ORDER: NewKind['kind'][] = ['parking', 'stand', 'feature', 'item', 'approach'];
const SUBJECTS = {
  stand: 'stand',
  parking: 'parking',
  approach: 'approach',
  feature: 'feature',
  item: 'map_item',
} as const;

function takenRows(scope: ClubScope, row: ImportRow, choices: SaveImport['rows']): Taken[] {
  if (new Set(choices.map((choice) => choice.row)).size !== choices.length) {
    throw new AppError('invalid', IMPORT_ERRORS.twice);
  }
  return choices.map(({ row: number, kind: value }) => {
    const thing = row.things[number - 1];
    const kind = kindOf(value);
    if (!thing || !kind) throw new AppError('invalid', IMPORT_ERRORS.unknown(number));
    if (!scope.can(NEEDS[kind.kind])) {
      throw new AppError('forbidden', IMPORT_ERRORS.role(scope.club.name));
    }
    const checked = checkRow(thing, row.swapped, scope.club);
    if (!checked.ok) throw new AppError('invalid', IMPORT_ERRORS.cannot(number, checked.message));
    const label = kindLabel(value);
    if (!fitsShape(value, shapeOf(checked.geometry))) {
      throw new AppError('invalid', IMPORT_ERRORS.shape(number, label));
    }
    return { row: number, name: thing.name, notes: thing.notes, geometry: checked.geometry, kind, label };
  });
}

async function beginTaking(scope: ClubScope, tx: Tx, now: number): Promise<Taking> {
  const { stands, parkings, features, approaches } = await loadGround(scope, tx);
  const ends = [...stands.map((stand) => standThing(stand, '')), ...parkings.map(parkingThing)];
  const names = (rows: { name: string }[]) => rows.map(({ name }) => name);
  return new Taking(scope, tx, now, ends, {
    stand: names(stands),
    parking: names(parkings),
    feature: names(features),
    ways: approaches,
  });
}

/** Adds the chosen rows of a file to the ground, all of them or none. */
export function saveImport(scope: ClubScope, input: SaveImport, now: number): Promise<{ added: number }> {
  return write(async (tx) => {
    const row = await getImport(scope, input.id, tx);
    if (!row) throw notFound();
    if (row.state !== 'read') throw new AppError('conflict', IMPORT_ERRORS.changedSince);
    const taken = takenRows(scope, row, input.rows);
    const taking = await beginTaking(scope, tx, now);
    for (const kind of ORDER) {
      for (const thing of taken) if (thing.kind.kind === kind) await taking.add(thing);
    }
    const { made } = taking;
    for (const { kind, id, name } of made) {
      const subject = SUBJECTS[kind];
      await noteChange(scope, tx, { subject, verb: 'added', id, summary: IMPORT_AUDIT.added(name, row.fileName) }, now);
    }
    if (!(await updateImport(scope, tx, input, { state: 'saved', made, savedAt: now }))) {
      throw new AppError('conflict', IMPORT_ERRORS.changedSince);
    }
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'import.saved',
        subjectType: 'import',
        subjectId: row.id,
        summary: IMPORT_AUDIT.saved(made.length, row.things.length, row.fileName),
      },
      now,
    );
    return { added: made.length };
  });
}
