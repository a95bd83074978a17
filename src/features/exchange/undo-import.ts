import { write } from '@/db/client';
import type { MadeThing } from '@/db/schema';
import { loadDrawn } from '@/features/map/drawn-rows';
import { removeDrawn } from '@/features/map/remove-drawn';
import type { Saving } from '@/features/map/set-drawn';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { AtImport } from './exchange-schema';
import { getImport, updateImport } from './imports-data';
import { IMPORT_AUDIT, IMPORT_ERRORS } from './words/import';

const ORDER: MadeThing['kind'][] = ['approach', 'stand', 'feature', 'item', 'parking'];
const TABLES = {
  stand: 'stands',
  parking: 'parkings',
  approach: 'approaches',
  feature: 'features',
  item: 'items',
} as const;

/** Takes away what a file added, but for what people have changed, booked or built upon since: that stays and is named. */
export function undoImport(scope: ClubScope, at: AtImport, now: number): Promise<{ removed: number; kept: string[] }> {
  return write(async (tx) => {
    const row = await getImport(scope, at.id, tx);
    if (!row) throw notFound();
    if (row.state !== 'saved') throw new AppError('conflict', IMPORT_ERRORS.changedSince);
    const saving: Saving = { scope, tx, now, rows: await loadDrawn(scope, tx), removed: new Set(), ids: {} };
    const own = new Set(row.made.map(({ id }) => id));
    const built = saving.rows.approaches
      .filter(({ id }) => !own.has(id))
      .flatMap((way) => [way.standId, way.parkingId]);
    const kept: string[] = [];
    let removed = 0;
    for (const kind of ORDER) {
      for (const { id, name } of row.made.filter((one) => one.kind === kind)) {
        const now = saving.rows[TABLES[kind]].find((one) => one.id === id);
        if (!now) continue;
        if (now.version !== 1 || built.includes(id)) {
          kept.push(now.name || name);
          continue;
        }
        try {
          await removeDrawn(saving, { op: 'remove', kind, id, version: 1 });
          removed += 1;
        } catch (error) {
          // A booked stand, or a parking place where a kept way begins: refused before anything is written.
          if (!(error instanceof AppError && error.code === 'conflict')) throw error;
          kept.push(name);
        }
      }
    }
    if (!(await updateImport(scope, tx, at, { state: 'undone', undoneAt: now }))) {
      throw new AppError('conflict', IMPORT_ERRORS.changedSince);
    }

    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'import.undone',
        subjectType: 'import',
        subjectId: row.id,
        summary: IMPORT_AUDIT.undone(removed, row.fileName, kept),
      },
      now,
    );
    return { removed, kept };
  });
}
