import { createHash } from 'node:crypto';
import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type Client, createClient } from '@libsql/client';
import { closeDatabase, useDatabase as pointAt } from '@/db/client';

/** What a refused call may leave: how often somebody has tried, and weather fetched to judge by. Neither is of the body. */
const NOT_OF_THE_BODY = ['rate_limits', 'forecasts'];

export interface SnapshotDatabase {
  /** Points the process at a fresh copy of the database as it was. */
  reset(): Promise<void>;
  /** Changes whenever another connection commits. */
  version(): Promise<number>;
  /** A digest of every row but those of NOT_OF_THE_BODY. */
  digest(): Promise<string>;
  close(): Promise<void>;
}

/** Keeps the database of the moment, to start from again and again. */
export async function keepDatabase(url: string): Promise<SnapshotDatabase> {
  const folder = mkdtempSync(join(tmpdir(), 'windrest-snapshot-'));
  const kept = join(folder, 'kept.db');
  const source = createClient({ url });
  await source.execute(`VACUUM INTO '${kept}'`);
  source.close();
  let copies = 0;
  let watcher: Client | undefined;

  const own = () => {
    if (!watcher) throw new Error('Call reset() first.');
    return watcher;
  };
  const drop = async () => {
    watcher?.close();
    await closeDatabase();
    for (const end of ['', '-wal', '-shm']) rmSync(join(folder, `copy-${copies}.db${end}`), { force: true });
  };
  return {
    async reset() {
      await drop();
      const file = join(folder, `copy-${++copies}.db`);
      copyFileSync(kept, file);
      await pointAt(`file:${file}`);
      watcher = createClient({ url: `file:${file}`, concurrency: 1 });
    },
    async version() {
      const { rows } = await own().execute('PRAGMA data_version');
      return Number(rows[0]?.data_version);
    },
    async digest() {
      const tables = await own().execute("SELECT name FROM sqlite_schema WHERE type = 'table' ORDER BY name");
      const hash = createHash('sha256');
      for (const { name } of tables.rows) {
        if (NOT_OF_THE_BODY.includes(String(name))) continue;
        const { rows } = await own().execute(`SELECT * FROM "${name}" ORDER BY rowid`);
        hash.update(`${name} ${JSON.stringify(rows)}`);
      }
      return hash.digest('hex');
    },
    async close() {
      await drop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
