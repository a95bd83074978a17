import { write } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { AtImport } from './exchange-schema';
import { getImport, updateImport } from './imports-data';
import { IMPORT_ERRORS } from './words/import';

/** Takes the file's latitude for longitude and the other way round. */
export function swapImport(scope: ClubScope, at: AtImport): Promise<{ swapped: boolean }> {
  return write(async (tx) => {
    const row = await getImport(scope, at.id, tx);
    if (!row) throw notFound();
    if (row.state !== 'read') throw new AppError('conflict', IMPORT_ERRORS.changedSince);
    const swapped = !row.swapped;
    if (!(await updateImport(scope, tx, at, { swapped }))) throw new AppError('conflict', IMPORT_ERRORS.changedSince);
    return { swapped };
  });
}
