import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { can, ROLES, type Role } from '@/core/permissions';
import type { ErrorCode } from '@/server/errors';
import { type DemoVisitors, openDemo, VISITORS, type Visitor } from '../helpers/demo-visitors';
import { type FoundDoor, filesThatAnswer, findDoors, hiddenActions } from '../helpers/list-doors';
import { inRequest } from '../helpers/request';
import { ACCESS_ROWS, type Entry } from './access-matrix-rows';

/** Pages that show nothing but themselves. */
const WITHOUT_DOOR = ['dev/ui/page.tsx default'];

type Outcome = 'enters' | 'signed_out' | 'forbidden' | 'not_found';

const { doors, bare } = await findDoors();
const VISITOR_NAMES = Object.keys(VISITORS) as Visitor[];

const isRole = (visitor: string): visitor is Role => ROLES.some((role) => role === visitor);
const entryOf = (door: FoundDoor): Entry | undefined => ACCESS_ROWS[door.file]?.[door.name];

/** What the permission table says of a visitor at a door. */
function expected(entry: Entry, visitor: Visitor): Outcome {
  if (entry === 'anyone') return 'enters';
  if (visitor === 'signed out') return 'signed_out';
  if (entry === 'account') return 'enters';
  if (!isRole(visitor)) return 'not_found';
  return can(visitor, entry) ? 'enters' : 'forbidden';
}

function paramsOf(file: string, demo: DemoVisitors): Record<string, string> {
  const names = [...file.matchAll(/\[(\w+)\]/g)].map(([, name]) => name ?? '');
  return Object.fromEntries(
    names.map((name) => {
      const value = demo.params[name];
      if (value === undefined) throw new Error(`tests/helpers/demo-visitors.ts has no ${name} for ${file}.`);
      return [name, value];
    }),
  );
}

function outcomeOf(code: ErrorCode | null): Outcome | ErrorCode {
  // The door let the visitor in, and the call failed on what it carried.
  if (code === null || code === 'invalid' || code === 'limit') return 'enters';
  return code;
}

async function callAction(door: FoundDoor, demo: DemoVisitors): Promise<Outcome | ErrorCode> {
  const call = door.run as (...args: unknown[]) => Promise<{ ok: boolean; error?: { code: ErrorCode } }>;
  const result = door.run.door.who === 'club' ? await call(demo.slug, undefined) : await call(undefined);
  return outcomeOf(result.ok ? null : (result.error?.code ?? 'internal'));
}

async function callRoute(door: FoundDoor, demo: DemoVisitors): Promise<Outcome | ErrorCode> {
  const call = door.run as (...args: unknown[]) => Promise<Response>;
  const context = { params: Promise.resolve(paramsOf(door.file, demo)) };
  const response = await call(new Request('http://127.0.0.1/here'), context);
  const body: { error?: { code: ErrorCode } } = response.ok ? {} : await response.json();
  return outcomeOf(response.ok ? null : (body.error?.code ?? 'internal'));
}

/** Next answers by throwing: a redirect, or the page for what is not there. */
async function callPage(door: FoundDoor, demo: DemoVisitors): Promise<string> {
  const params = Promise.resolve(paramsOf(door.file, demo));
  try {
    await door.run({ params, searchParams: Promise.resolve({}) });
    return 'enters';
  } catch (error) {
    const digest = error instanceof Error && 'digest' in error ? String(error.digest) : '';
    if (digest.startsWith('NEXT_REDIRECT')) return digest.includes('/sign-in?next=') ? 'signed_out' : 'enters';
    if (digest === 'NEXT_HTTP_ERROR_FALLBACK;404') return 'not_found';
    throw error;
  }
}

async function outcome(door: FoundDoor, demo: DemoVisitors): Promise<string> {
  const { kind } = door.run.door;
  if (kind === 'action') return callAction(door, demo);
  return kind === 'route' ? callRoute(door, demo) : callPage(door, demo);
}

describe('the doors and their rows', () => {
  it('finds the files that answer requests', () => {
    expect(filesThatAnswer().length).toBeGreaterThan(40);
    expect(doors.length).toBeGreaterThan(60);
  });

  it('has no way in without a door', () => {
    expect(bare).toEqual(WITHOUT_DOOR);
    expect(hiddenActions()).toEqual([]);
  });

  it('declares actions only in files that say so', () => {
    const app = resolve(import.meta.dirname, '../../src/app');
    for (const file of filesThatAnswer().filter((name) => name.endsWith('actions.ts'))) {
      expect(readFileSync(`${app}/${file}`, 'utf8').startsWith("'use server';"), file).toBe(true);
    }
  });

  it('has a row for each door and a door for each row, with the same permission', () => {
    const declared: Record<string, Record<string, string>> = {};
    for (const { file, name, run } of doors) {
      const { who, permission } = run.door;
      declared[file] = { ...declared[file], [name]: permission ?? who };
    }
    expect(declared).toEqual(ACCESS_ROWS);
  });

  it('keeps every door under a club for the club', () => {
    for (const { file, name, run } of doors) {
      if (file.includes('[club]')) expect(run.door.who, `${file} ${name}`).toBe('club');
      if (run.door.who === 'club') expect(run.door.permission, `${file} ${name}`).not.toBeNull();
    }
  });
});

describe.each(VISITOR_NAMES)('%s', (visitor) => {
  let demo: DemoVisitors;
  beforeAll(async () => {
    demo = await shared();
  });

  it.each(doors.map((door) => ({ door, at: `${door.file} ${door.name}` })))('at $at', async ({ door }) => {
    const entry = entryOf(door);
    if (entry === undefined) throw new Error('This door has no row in access-matrix-rows.ts.');
    const wanted = expected(entry, visitor);
    const { kind, who } = door.run.door;
    const found = await inRequest(demo.browsers[visitor], () => outcome(door, demo));
    // A page hides what is closed to a person; a link that nobody was sent is not there for anyone.
    const hidden = kind === 'page' && wanted === 'forbidden';
    const deadLink = who === 'anyone' && /\[(id|secret)\]/.test(door.file);
    expect(found).toBe(hidden || deadLink ? 'not_found' : wanted);
  });
});

let opened: Promise<DemoVisitors> | undefined;
function shared(): Promise<DemoVisitors> {
  opened ??= openDemo();
  return opened;
}
