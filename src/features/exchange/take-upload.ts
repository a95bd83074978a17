import { write } from '@/db/client';
import { newId } from '@/lib/ids';
import { AppError } from '@/server/errors';
import { readBody } from '@/server/read-body';
import type { ClubScope } from '@/server/scope';
import { insertImport } from './imports-data';
import { MOST_BYTES } from './read/limits';
import { readApart } from './read/read-apart';
import { FILE_PROBLEMS } from './words/files';

/** Reads a file and keeps what it holds for looking over. Nothing of the ground changes yet. */
export async function takeUpload(
  scope: ClubScope,
  upload: { name: string; request: Request },
  now: number,
): Promise<{ id: string }> {
  const tooMuch = FILE_PROBLEMS.bytes(MOST_BYTES / 1024 / 1024);
  const bytes = await readBody(upload.request, MOST_BYTES, tooMuch);
  const read = await readApart(bytes);
  if (!read.ok) throw new AppError('invalid', read.message);
  const { format, things, remarks } = read;
  const id = newId('import');
  await write((tx) => insertImport(scope, tx, { id, fileName: upload.name, format, things, remarks, createdAt: now }));
  return { id };
}
