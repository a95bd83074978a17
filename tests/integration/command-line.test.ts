import { spawnSync } from 'node:child_process';
import { copyFileSync, existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { createClient } from '@libsql/client';
import { afterEach, beforeEach, describe, expect, inject, it } from 'vitest';

const root = resolve(import.meta.dirname, '../..');
const TOOLS: [string, ...string[]][] = [
  ['sits', '--list-clubs'],
  ['sits', '--club', 'tansy-fork'],
  ['hindcast', '--club', 'tansy-fork', '--weather', 'replay:hours.csv'],
  ['jobs'],
];

let folder: string;
let file: string;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'windrest-tools-'));
  file = join(folder, 'app.db');
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

function run(script: string, ...args: string[]) {
  const tsx = join(root, 'node_modules/tsx/dist/cli.mjs');
  return spawnSync(process.execPath, [tsx, '--conditions=react-server', `scripts/${script}.ts`, ...args], {
    cwd: root,
    env: Object.assign({ ...process.env }, { DATABASE_URL: `file:${file}` }),
    encoding: 'utf8',
  });
}

const saysWhatToDo = (done: ReturnType<typeof run>) => {
  expect(done.status).toBe(1);
  expect(done.stdout).toBe('');
  expect(done.stderr.trimEnd()).toBe(
    `The database at file:${file} is missing or not up to date: run npm run db:migrate, then try again.`,
  );
};

describe('a tool of the command line', () => {
  it.each(TOOLS)(
    'says in one line what to do without a database, and makes none: %s %s',
    (script, ...args) => {
      saysWhatToDo(run(script, ...args));
      expect(existsSync(file)).toBe(false);
    },
    60_000,
  );

  it('says the same of an empty database, and of one behind by a migration', async () => {
    const client = createClient({ url: `file:${file}` });
    await client.execute('create table other (id text)');
    client.close();
    saysWhatToDo(run('sits', '--list-clubs'));

    copyFileSync(inject('templateDatabase'), file);
    const behind = createClient({ url: `file:${file}` });
    await behind.execute(
      'delete from __drizzle_migrations where created_at = (select max(created_at) from __drizzle_migrations)',
    );
    behind.close();
    saysWhatToDo(run('jobs'));
  }, 60_000);

  it('says what is wrong with a file that is no database', () => {
    writeFileSync(file, 'no database'.repeat(1000));
    const done = run('sits', '--list-clubs');
    expect(done.status).toBe(1);
    expect(done.stderr.trimEnd().split('\n')).toHaveLength(1);
    expect(done.stderr).toContain('cannot be opened');
  }, 60_000);

  it('works on one that is up to date', () => {
    copyFileSync(inject('templateDatabase'), file);
    const done = run('sits', '--list-clubs');
    expect(done.stderr).toBe('');
    expect(done.status).toBe(0);
    expect(done.stdout).toContain('No clubs yet');
  }, 60_000);
});
