import { randomUUID } from 'node:crypto';
import { mkdir, readdir, readFile, rename, rm, stat, writeFile } from 'node:fs/promises';
import { dirname, join, relative, resolve, sep } from 'node:path';
import { checkKey, type FilesPort, type KeptFile } from './port';

const missing = (error: unknown) => error instanceof Error && 'code' in error && error.code === 'ENOENT';

/** Being written; never listed and never read. */
const PARTIAL = '.part-';

/** Files in a folder of this machine. A file is whole or not there: it is written aside and moved into its place. */
export function makeDiskFiles(folder: string): FilesPort {
  const root = resolve(folder);
  const pathOf = (key: string) => join(root, ...checkKey(key).split('/'));
  return {
    source: 'disk',
    async put(key, bytes) {
      const path = pathOf(key);
      await mkdir(dirname(path), { recursive: true });
      const aside = join(dirname(path), `${PARTIAL}${randomUUID()}`);
      await writeFile(aside, bytes);
      await rename(aside, path);
    },
    async get(key) {
      return readFile(pathOf(key)).catch((error: unknown) => {
        if (missing(error)) return null;
        throw error;
      });
    },
    async remove(keys) {
      for (const key of keys) await rm(pathOf(key), { force: true });
    },
    async *list(prefix): AsyncIterable<KeptFile> {
      const names = await readdir(root, { recursive: true }).catch((error: unknown) => {
        if (missing(error)) return [];
        throw error;
      });
      for (const name of names.sort()) {
        const key = relative(root, join(root, name)).split(sep).join('/');
        if (!key.startsWith(prefix) || key.includes(`/${PARTIAL}`)) continue;
        const found = await stat(join(root, name)).catch(() => null);
        if (found?.isFile()) yield { key, writtenAt: found.mtimeMs };
      }
    },
  };
}
