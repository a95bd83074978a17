import { type ChildProcess, spawn, spawnSync } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

const root = resolve(import.meta.dirname, '../..');

async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1');
  await once(server, 'listening');
  const address = server.address();
  server.close();
  if (typeof address !== 'object' || !address) throw new Error('No free port.');
  return address.port;
}

export interface ServedApp {
  url: string;
  databaseUrl: string;
  /** What the server has printed so far. */
  output: () => string;
  stop: () => Promise<void>;
}

function runScript(script: string, env: NodeJS.ProcessEnv): void {
  const tsx = join(root, 'node_modules/tsx/dist/cli.mjs');
  const done = spawnSync(process.execPath, [tsx, '--conditions=react-server', `scripts/${script}.ts`], {
    cwd: root,
    env,
    encoding: 'utf8',
  });
  if (done.status !== 0) throw new Error(`scripts/${script}.ts failed:\n${done.stdout}\n${done.stderr}`);
}

async function answers(url: string, child: ChildProcess, output: () => string): Promise<void> {
  for (let tries = 0; tries < 300; tries++) {
    if (child.exitCode !== null) throw new Error(`The server stopped:\n${output()}`);
    const response = await fetch(`${url}/api/health`).catch(() => null);
    if (response?.ok) return;
    await wait(100);
  }
  throw new Error(`The server did not answer:\n${output()}`);
}

/** The built app on a database of its own, with the demo club when `seed` is set. */
export async function serveApp(options: { seed?: boolean; env?: Record<string, string> } = {}): Promise<ServedApp> {
  const folder = mkdtempSync(join(tmpdir(), 'windrest-e2e-'));
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const databaseUrl = `file:${join(folder, 'app.db')}`;
  const env: NodeJS.ProcessEnv = {
    ...process.env,
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    PORT: String(port),
    APP_URL: url,
    DATABASE_URL: databaseUrl,
    DEV_PAGES: '1',
    ...options.env,
  };
  runScript('migrate', env);
  if (options.seed) runScript('seed', env);
  const next = join(root, 'node_modules/next/dist/bin/next');
  const child = spawn(process.execPath, [next, 'start', '-H', '127.0.0.1', '-p', String(port)], { cwd: root, env });
  let printed = '';
  child.stdout.on('data', (chunk) => {
    printed += chunk;
  });
  child.stderr.on('data', (chunk) => {
    printed += chunk;
  });
  await answers(url, child, () => printed);
  return {
    url,
    databaseUrl,
    output: () => printed,
    stop: async () => {
      if (child.exitCode === null) {
        child.kill('SIGTERM');
        await Promise.race([once(child, 'exit'), wait(10_000).then(() => child.kill('SIGKILL'))]);
      }
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
