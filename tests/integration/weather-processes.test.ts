import { execFile } from 'node:child_process';
import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { getResponse } from 'msw';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { z } from 'zod';
import { makeWeatherHandlers } from '@/adapters/weather/fake/handlers';

const run = promisify(execFile);
const folder = mkdtempSync(join(tmpdir(), 'windrest-weather-'));
const asked: string[] = [];
const handlers = makeWeatherHandlers({ now: Date.now, onRequest: (kind) => asked.push(kind) });
const server = createServer(async (incoming, outgoing) => {
  const response = await getResponse(handlers, new Request(`http://127.0.0.1${incoming.url}`));
  outgoing.writeHead(response?.status ?? 404).end(Buffer.from((await response?.arrayBuffer()) ?? new ArrayBuffer(0)));
});

beforeAll(() => new Promise<void>((done) => server.listen(0, '127.0.0.1', done)));
afterAll(() => {
  server.close();
  rmSync(folder, { recursive: true, force: true });
});

it('three processes with ten tries each make one request', async () => {
  const file = join(folder, 'weather.db');
  copyFileSync(inject('templateDatabase'), file);
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('The test server has no port.');
  const url = `http://127.0.0.1:${address.port}`;
  const settings = {
    ...process.env,
    NODE_ENV: 'test' as const,
    DATABASE_URL: `file:${file}`,
    WEATHER: 'hosted',
    WEATHER_FORECAST_URL: `${url}/v1/forecast`,
    WEATHER_ENSEMBLE_URL: `${url}/v1/ensemble`,
  };
  const script = 'tests/integration/weather-refresh-process.ts';
  const args = ['--import', 'tsx', '--conditions=react-server', script, String(Date.now()), '34.12', '-83.99'];
  const ran = await Promise.all([1, 2, 3].map(() => run(process.execPath, args, { env: settings })));
  const outcomes = ran.flatMap(({ stdout }) => z.array(z.string()).parse(JSON.parse(stdout)));
  expect(outcomes).toHaveLength(30);
  expect(outcomes.filter((status) => status === 'refreshed')).toHaveLength(1);
  expect(outcomes.filter((status) => status === 'failed')).toEqual([]);
  expect(asked.sort()).toEqual(['ensemble', 'forecast']);
});
