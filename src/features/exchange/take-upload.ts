import { write } from '@/db/client';
import { newId } from '@/lib/ids';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { insertImport } from './imports-data';
import { MOST_BYTES } from './read/limits';
import { readMapFile } from './read/read-file';

/** The body of a request, given up as soon as it is more than a file may be. */
export async function readBody(request: Request, most: number, tooMuch: string): Promise<Uint8Array> {
  const reader = request.body?.getReader();
  if (!reader) return new Uint8Array();
  const chunks: Uint8Array[] = [];
  let length = 0;
  for (let step = await reader.read(); !step.done; step = await reader.read()) {
    length += step.value.length;
    if (length > most) {
      await reader.cancel();
      throw new AppError('invalid', tooMuch);
    }
    chunks.push(step.value);
  }
  return Buffer.concat(chunks);
}

/** Reads a file and keeps what it holds for looking over. Nothing of the ground changes yet. */
export async function takeUpload(
  scope: ClubScope,
  upload: { name: string; request: Request },
  now: number,
): Promise<{ id: string }> {
  const tooMuch = `The file is over ${MOST_BYTES / 1024 / 1024} MB: split it, or leave out what is not needed.`;
  const bytes = await readBody(upload.request, MOST_BYTES, tooMuch);
  const read = readMapFile(bytes);
  if (!read.ok) throw new AppError('invalid', read.message);
  const { format, things, remarks } = read;
  const id = newId('import');
  await write((tx) => insertImport(scope, tx, { id, fileName: upload.name, format, things, remarks, createdAt: now }));
  return { id };
}
