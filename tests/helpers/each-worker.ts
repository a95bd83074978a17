import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, inject } from 'vitest';
import { closeDatabase, useDatabase } from '@/db/client';
import { setClock } from '@/server/clock';

const folder = mkdtempSync(join(tmpdir(), 'windrest-test-'));
const file = join(folder, 'test.db');

beforeAll(async () => {
  copyFileSync(inject('templateDatabase'), file);
  await useDatabase(`file:${file}`);
});

afterAll(async () => {
  setClock();
  await closeDatabase();
  rmSync(folder, { recursive: true, force: true });
});
