import { createClient } from '@libsql/client';
import { drizzle } from 'drizzle-orm/libsql';
import { migrate } from 'drizzle-orm/libsql/migrator';
import { env } from '@/env';
import { isBusy } from './errors';
import { makeFolderFor } from './folder';

async function migrateOnce(url: string): Promise<void> {
  const client = createClient({ url, ...(env.databaseToken ? { authToken: env.databaseToken } : {}) });
  try {
    if (url.startsWith('file:')) await client.execute('PRAGMA journal_mode = WAL');
    await migrate(drizzle(client), { migrationsFolder: 'drizzle' });
  } finally {
    client.close();
  }
}

/** Brings a database up to date. Two processes may start it at once: the one that comes second looks again. */
export async function migrateDatabase(url: string): Promise<void> {
  makeFolderFor(url);
  try {
    await migrateOnce(url);
  } catch (error) {
    if (!isBusy(error) && !String(error).includes('already exists')) throw error;
    await migrateOnce(url);
  }
}
