import { write } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { AtImport } from './exchange-schema';
import { getImport, updateImport } from './imports-data';

export const CHANGED_SINCE = 'Somebody has worked on this file since you opened it: look at it again.';

/** Takes the file's latitude for longitude and the other way round. */
export function swapImport(scope: ClubScope, at: AtImport): Promise<{ swapped: boolean }> {
  return write(async (tx) => {
    const row = await getImport(scope, at.id, tx);
    if (!row) throw notFound();
    if (row.state !== 'read') throw new AppError('conflict', CHANGED_SINCE);
    const swapped = !row.swapped;
    if (!(await updateImport(scope, tx, at, { swapped }))) throw new AppError('conflict', CHANGED_SINCE);
    return { swapped };
  });
}
