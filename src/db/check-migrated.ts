import { existsSync, readFileSync } from 'node:fs';
import { createClient } from '@libsql/client';
import { z } from 'zod';
import { env } from '@/env';
import { databaseFile } from './folder';

const journalSchema = z.object({ entries: z.array(z.object({ when: z.number() })).min(1) });

function newestMigration(): number {
  const { entries } = journalSchema.parse(JSON.parse(readFileSync('drizzle/meta/_journal.json', 'utf8')));
  return Math.max(...entries.map(({ when }) => when));
}

/** Whether every migration of this program has run. Makes no file; drizzle keeps the times in `__drizzle_migrations`. */
export async function isMigrated(url: string): Promise<boolean> {
  const file = databaseFile(url);
  if (file !== null && !existsSync(file)) return false;
  const client = createClient({ url, ...(env.databaseToken ? { authToken: env.databaseToken } : {}) });
  try {
    const kept = await client.execute("select 1 from sqlite_master where name = '__drizzle_migrations'");
    if (kept.rows.length === 0) return false;
    const { rows } = await client.execute('select max(created_at) as newest from __drizzle_migrations');
    return Number(rows[0]?.newest ?? 0) >= newestMigration();
  } finally {
    client.close();
  }
}
