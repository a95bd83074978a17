import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';

declare module 'vitest' {
  interface ProvidedContext {
    templateDatabase: string;
  }
}

/** Migrates one file; each test file works on its own copy. */
export default async function setup(project: TestProject) {
  const folder = mkdtempSync(join(tmpdir(), 'windrest-template-'));
  const file = join(folder, 'template.db');
  process.env.DATABASE_URL = `file:${file}`;
  const { migrateDatabase } = await import('../../src/db/migrate');
  await migrateDatabase(`file:${file}`);
  project.provide('templateDatabase', file);
  return () => rmSync(folder, { recursive: true, force: true });
}
