import { createServer, type Server } from 'node:http';
import { hillHeightM } from './hill';

/** Kept here because a development reload makes this module anew and must not open a second server. */
const holder = globalThis as { windrestFakeElevation?: Promise<{ url: string; server: Server }> };

function answer(url: URL): { status: number; body: unknown } {
  const read = (name: string) => (url.searchParams.get(name) ?? '').split(',').map(Number);
  const [lats, lons] = [read('latitude'), read('longitude')];
  const sound = lats.length === lons.length && lats.length <= 100 && [...lats, ...lons].every(Number.isFinite);
  if (url.pathname !== '/v1/elevation') return { status: 404, body: { error: true, reason: 'Not Found' } };
  if (!sound) return { status: 400, body: { error: true, reason: 'Parameter latitude and longitude must match.' } };
  return {
    status: 200,
    body: { elevation: lats.map((lat, i) => Math.round(hillHeightM({ lat, lon: lons[i] ?? 0 }) * 10) / 10) },
  };
}

async function listen(): Promise<{ url: string; server: Server }> {
  const server = createServer((incoming, outgoing) => {
    const { status, body } = answer(new URL(incoming.url ?? '/', 'http://127.0.0.1'));
    outgoing.writeHead(status, { 'Content-Type': 'application/json' }).end(JSON.stringify(body));
  });
  await new Promise<void>((done, fail) => {
    server.once('error', fail);
    server.listen(0, '127.0.0.1', done);
  });
  server.on('connection', (socket) => socket.unref());
  server.unref();
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('The made hills have no port.');
  return { url: `http://127.0.0.1:${address.port}/v1/elevation`, server };
}

/** Serves the made hills on this machine, once a process; gives the address. It never keeps a process alive. */
export async function serveFakeElevation(): Promise<string> {
  holder.windrestFakeElevation ??= listen().catch((error: unknown) => {
    holder.windrestFakeElevation = undefined;
    throw error;
  });
  return (await holder.windrestFakeElevation).url;
}

/** For tests and tools that end tidily. */
export async function stopFakeElevation(): Promise<void> {
  const running = await holder.windrestFakeElevation;
  holder.windrestFakeElevation = undefined;
  if (!running) return;
  running.server.closeAllConnections();
  await new Promise((done) => running.server.close(done));
}
