import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { GET } from '@/app/api/health/route';
import { closeDatabase, useDatabase as openDatabase, write } from '@/db/client';
import { forecasts } from '@/db/schema';
import { setClock } from '@/server/clock';
import { version } from '../../package.json';
import { inRequest, newBrowser } from '../helpers/request';

const NOW = Date.UTC(2026, 10, 4, 15);

const ask = () =>
  inRequest(newBrowser(), () =>
    GET(new Request('http://127.0.0.1/api/health'), { params: Promise.resolve<Record<string, string>>({}) }),
  );

it('says what runs, how old the forecast is, and 503 when the database does not answer', async () => {
  setClock(() => NOW);
  const bare = { ok: true, version, database: 'ok', mail: { mode: 'kept', waiting: 0, dead: 0 } };
  const first = await ask();
  expect(first.status).toBe(200);
  expect(await first.json()).toEqual({ ...bare, weather: { mode: 'fake', lastFetchedAt: null, ageMinutes: null } });
  const fetchedAt = NOW - 90 * 60_000;
  await write((tx) => tx.insert(forecasts).values({ placeKey: 'fake@34.12,-84', fetchedAt, nextFetchAt: NOW }));
  const second = await (await ask()).json();
  expect(second.weather).toEqual({ mode: 'fake', lastFetchedAt: fetchedAt, ageMinutes: 90 });
  const folder = mkdtempSync(join(tmpdir(), 'windrest-health-'));
  const file = join(folder, 'broken.db');
  writeFileSync(file, 'this is no database '.repeat(100));
  try {
    await openDatabase(`file:${file}`);
    const broken = await ask();
    expect(broken.status).toBe(503);
    expect(await broken.json()).toMatchObject({ ok: false, version, database: 'error', mail: null });
  } finally {
    await closeDatabase();
    rmSync(folder, { recursive: true, force: true });
  }
});
