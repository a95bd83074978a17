import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { getResponse } from 'msw';
import { makeWeatherHandlers } from './handlers';

/** Kept here because a development reload makes this module anew and must not open a second server. */
const holder = globalThis as {
  windrestFakeWeather?: Promise<{ url: string; server: Server }>;
  windrestFakeClock?: () => number;
};

/**
 * Starts the made weather's server on this machine once a process; gives its address. It never keeps a process alive. The
 * clock given last is the one it goes by.
 */
export async function serveFakeWeather(now: () => number = Date.now): Promise<string> {
  holder.windrestFakeClock = now;
  holder.windrestFakeWeather ??= listen().catch((error: unknown) => {
    holder.windrestFakeWeather = undefined;
    throw error;
  });
  return (await holder.windrestFakeWeather).url;
}

/** For tests and tools that end tidily. */
export async function stopFakeWeather(): Promise<void> {
  const running = await holder.windrestFakeWeather;
  holder.windrestFakeWeather = undefined;
  if (!running) return;
  running.server.closeAllConnections();
  await new Promise((done) => running.server.close(done));
}

async function listen(): Promise<{ url: string; server: Server }> {
  const handlers = makeWeatherHandlers({ now: () => (holder.windrestFakeClock ?? Date.now)() });
  const server = createServer(async (incoming, outgoing) => {
    try {
      const request = new Request(new URL(incoming.url ?? '/', 'http://127.0.0.1'), {
        method: incoming.method ?? 'GET',
      });
      const response = await getResponse(handlers, request);
      outgoing.writeHead(response?.status ?? 404, Object.fromEntries(response?.headers ?? []));
      outgoing.end(response ? Buffer.from(await response.arrayBuffer()) : undefined);
    } catch {
      outgoing.writeHead(500).end();
    }
  });
  await new Promise<void>((done, fail) => {
    server.once('error', fail);
    server.listen(0, '127.0.0.1', done);
  });
  server.on('connection', (socket) => socket.unref());
  server.unref();
  return { url: addressOf(server.address()), server };
}

function addressOf(address: string | AddressInfo | null): string {
  if (address === null || typeof address === 'string') throw new Error('The made weather has no port.');
  return `http://127.0.0.1:${address.port}`;
}
