import { spawn } from 'node:child_process';
import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { reader, useDatabase } from '@/db/client';
import { auditLog, claims, outbox, sits } from '@/db/schema';
import { setClock } from '@/server/clock';
import type { ContendOrder, ContendTally } from '../helpers/contend-worker';
import { addMember, addStand, makeClub, TEST_NOW, type TestMember } from '../helpers/make-club';

const PROCESSES = 2;
const ATTEMPTS = 500;
const STANDS = 10;
const MEMBERS = 25;

const folder = mkdtempSync(join(tmpdir(), 'windrest-contend-'));
const databaseUrl = `file:${join(folder, 'contend.db')}`;

beforeAll(async () => {
  copyFileSync(inject('templateDatabase'), join(folder, 'contend.db'));
  await useDatabase(databaseUrl);
  setClock(() => TEST_NOW);
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

function contend(order: ContendOrder): Promise<ContendTally> {
  const args = [
    '--import',
    'tsx',
    '--conditions=react-server',
    'tests/helpers/contend-worker.ts',
    JSON.stringify(order),
  ];
  const child = spawn(process.execPath, args, {
    env: { ...process.env, DATABASE_URL: databaseUrl },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  return new Promise((resolve, reject) => {
    const said = { out: '', err: '' };
    child.stdout.on('data', (chunk) => (said.out += chunk));
    child.stderr.on('data', (chunk) => (said.err += chunk));
    child.on('error', reject);
    child.on('close', (code) => (code === 0 ? resolve(JSON.parse(said.out)) : reject(new Error(said.err))));
  });
}

it('gives each of ten claims to exactly one of a thousand attempts by two processes', async () => {
  const club = await makeClub();
  const standIds: string[] = [];
  for (let n = 0; n < STANDS; n++) standIds.push(await addStand(club));
  const members: TestMember[] = [];
  for (let n = 0; n < MEMBERS * PROCESSES; n++) members.push(await addMember(club));
  const order = { slug: club.slug, standIds, day: '2026-11-07', attempts: ATTEMPTS, now: TEST_NOW };
  const tallies = await Promise.all(
    Array.from({ length: PROCESSES }, (_, n) => {
      const mine = members.slice(n * MEMBERS, (n + 1) * MEMBERS);
      return contend({ ...order, userIds: mine.map((member) => member.userId) });
    }),
  );
  const total = (end: string) => tallies.reduce((sum, tally) => sum + (tally[end] ?? 0), 0);
  expect(tallies.flatMap((tally) => Object.keys(tally)).filter((end) => !['booked', 'conflict'].includes(end))).toEqual(
    [],
  );
  expect([total('booked'), total('conflict')]).toEqual([STANDS, PROCESSES * ATTEMPTS - STANDS]);

  const made = {
    sits: await reader().select().from(sits).where(eq(sits.clubId, club.id)),
    claims: await reader().select().from(claims).where(eq(claims.clubId, club.id)),
    audit: await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id)),
    mail: await reader().select().from(outbox).where(eq(outbox.clubId, club.id)),
  };
  const ids = made.sits.map((sit) => sit.id).sort();
  expect(ids).toHaveLength(STANDS);
  expect(made.sits.map((sit) => sit.standId).sort()).toEqual([...standIds].sort());
  expect(new Set(made.sits.map((sit) => sit.memberId)).size).toBe(STANDS);
  expect(made.claims.map((claim) => claim.sitId).sort()).toEqual(ids);
  expect(made.audit.map((row) => row.subjectId).sort()).toEqual(ids);
  expect(made.mail.map((row) => row.dedupeKey).sort()).toEqual(ids.map((id) => `sit.booked:${id}:0`));
});
