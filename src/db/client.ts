import { AsyncLocalStorage } from 'node:async_hooks';
import { setTimeout as wait } from 'node:timers/promises';
import { type Client, createClient } from '@libsql/client';
import { drizzle, type LibSQLDatabase } from 'drizzle-orm/libsql';
import { env } from '@/env';
import { isBusy } from './errors';
import { makeFolderFor } from './folder';
import * as schema from './schema';

export type Reader = LibSQLDatabase<typeof schema>;
export type Tx = Parameters<Parameters<Reader['transaction']>[0]>[0];
/** What a query may be given: reads inside a change must see that change. */
export type ReadFrom = Reader | Tx;

interface Held {
  url: string;
  readerClient: Client;
  reader: Reader;
  writerClient: Client;
  writer: Reader;
  tail: Promise<unknown>;
}

/** How long a write waits for other processes before it gives up. */
const LONGEST_WAIT_MS = 30_000;
const READER_BUSY_MS = 250;

/** Kept here because a development reload makes this module anew. */
const holder = globalThis as { windrestDatabase?: Held };
const inTransaction = new AsyncLocalStorage<true>();

function open(url: string): Held {
  makeFolderFor(url);
  const options = { url, ...(env.databaseToken ? { authToken: env.databaseToken } : {}) };
  const readerClient = createClient({ ...options, timeout: READER_BUSY_MS });
  // No busy timeout here: its wait would freeze the process; `write` waits between tries instead.
  const writerClient = createClient({ ...options, concurrency: 1 });
  return {
    url,
    readerClient,
    reader: drizzle(readerClient, { schema, casing: 'snake_case' }),
    writerClient,
    writer: drizzle(writerClient, { schema, casing: 'snake_case' }),
    tail: Promise.resolve(),
  };
}

function held(): Held {
  holder.windrestDatabase ??= open(env.databaseUrl);
  return holder.windrestDatabase;
}

/** For reads only. */
export function reader(): Reader {
  return held().reader;
}

async function attempt<T>(db: Held, work: (tx: Tx) => Promise<T>): Promise<T> {
  const start = Date.now();
  for (let tries = 1; ; tries++) {
    try {
      return await inTransaction.run(true, () => db.writer.transaction(work));
    } catch (error) {
      if (!isBusy(error) || Date.now() - start > LONGEST_WAIT_MS) throw error;
      // A connection that met BUSY inside a transaction cannot commit again.
      db.writerClient.reconnect();
      await wait(1 + Math.random() * Math.min(50, 2 * tries));
    }
  }
}

/**
 * Runs one write transaction: one at a time in this process, tried again while another process writes. `work` may run
 * more than once, so it touches nothing but `tx`: no network, no second write.
 */
export async function write<T>(work: (tx: Tx) => Promise<T>): Promise<T> {
  if (inTransaction.getStore()) throw new Error('A write was started inside a write: pass the transaction on instead.');
  const db = held();
  const turn = db.tail.then(() => attempt(db, work));
  db.tail = turn.catch(() => undefined);
  return turn;
}

/** Points this process at another database (tests, tools) and closes the one before. */
export async function useDatabase(url: string): Promise<void> {
  await closeDatabase();
  holder.windrestDatabase = open(url);
}

export async function closeDatabase(): Promise<void> {
  const before = holder.windrestDatabase;
  if (!before) return;
  await before.tail;
  before.readerClient.close();
  before.writerClient.close();
  holder.windrestDatabase = undefined;
}
