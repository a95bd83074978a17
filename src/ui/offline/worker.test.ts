import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { createContext, runInContext } from 'node:vm';
import { beforeEach, describe, expect, it } from 'vitest';

const ORIGIN = 'https://club.test';
const CODE = readFileSync(resolve(import.meta.dirname, '../../../public/sw.js'), 'utf8');

/** A cache in memory with what the worker uses of one. */
class FakeCache {
  readonly rows = new Map<string, Response>();
  private address = (of: string | Request) => new URL(typeof of === 'string' ? of : of.url, ORIGIN).href;
  async match(of: string | Request, options: { ignoreSearch?: boolean } = {}) {
    const url = this.address(of);
    const bare = (text: string) => (options.ignoreSearch ? text.split('?')[0] : text);
    return [...this.rows].find(([key]) => bare(key) === bare(url))?.[1].clone();
  }
  async put(of: string | Request, response: Response) {
    this.rows.set(this.address(of), response);
  }
  async delete(of: string | Request) {
    return this.rows.delete(this.address(of));
  }
  async keys() {
    return [...this.rows.keys()].map((url) => new Request(url));
  }
}

type Listener = (event: object) => void;
type Answer = (url: string) => Response | Promise<Response>;

let listeners: Map<string, Listener>;
let stores: Map<string, FakeCache>;
let asked: string[];
let network: Answer;

beforeEach(() => {
  listeners = new Map();
  stores = new Map();
  asked = [];
  const caches = {
    keys: async () => [...stores.keys()],
    open: async (name: string) => stores.get(name) ?? stores.set(name, new FakeCache()).get(name),
    delete: async (name: string) => stores.delete(name),
  };
  const self = {
    addEventListener: (type: string, call: Listener) => listeners.set(type, call),
    location: { origin: ORIGIN },
  };
  const fetch = async (of: string | { url: string }) => {
    const url = new URL(typeof of === 'string' ? of : of.url, ORIGIN).href;
    asked.push(url.slice(ORIGIN.length));
    const answer = await network(url);
    Object.defineProperty(answer, 'type', { value: 'basic' });
    return answer;
  };
  // Waiting is over at once: a kept copy stands in for a network that says nothing.
  const soon = (call: (value: null) => void) => setImmediate(call, null);
  runInContext(CODE, createContext({ self, caches, fetch, URL, Response, setTimeout: soon }));
});

const page = (account: string, text: string) =>
  new Response(`<html lang="en"><span data-account="${account}"></span>${text}</html>`);
const offline: Answer = () => Promise.reject(new TypeError('Failed to fetch'));

async function fire(type: string, event: object): Promise<Response | null> {
  const work: Promise<unknown>[] = [];
  let answer: Promise<Response> | null = null;
  listeners.get(type)?.({
    ...event,
    waitUntil: (promise: Promise<unknown>) => work.push(promise),
    respondWith: (promise: Promise<Response>) => {
      answer = promise;
    },
  });
  const response = await answer;
  while (work.length > 0) await work.pop();
  return response;
}

const open = (path: string) =>
  fire('fetch', { request: { method: 'GET', mode: 'navigate', url: ORIGIN + path } }).then((r) => r?.text());
const warm = (pages: object[]) => fire('message', { data: { type: 'keep', pages } });
const kept = () => [...stores].filter(([name]) => name.startsWith('windrest-pages-'));

describe('the worker', () => {
  it('keeps a page it shows, and without signal shows it marked as kept', async () => {
    network = () => page('a1', 'Oak Ladder');
    expect(await open('/clubs/oak/sit')).toContain('Oak Ladder');
    network = offline;
    expect(await open('/clubs/oak/sit?window=evening')).toMatch(/<html data-kept="" .*Oak Ladder/);
  });

  it('shows the kept copy when the network says nothing', async () => {
    network = () => page('a1', 'Oak Ladder');
    await open('/clubs/oak/board');
    let answer: (response: Response) => void = () => undefined;
    network = () =>
      new Promise((done) => {
        answer = done;
      });
    const shown = open('/clubs/oak/board');
    setImmediate(() => setImmediate(() => answer(page('a1', 'Elm Box'))));
    expect(await shown).toContain('Oak Ladder');
    network = offline;
    expect(await open('/clubs/oak/board')).toContain('Elm Box');
  });

  it('keeps no page that names no account, and none that nobody reads in the woods', async () => {
    network = (url) => (url.endsWith('/sit') ? new Response('<html lang="en">plain</html>') : page('a1', 'secret'));
    await open('/clubs/oak/sit');
    await open('/clubs/oak/club/members');
    await open('/account');
    expect(kept()).toEqual([]);
    network = offline;
    expect(await open('/clubs/oak/club/members')).toContain('No signal');
  });

  it('keeps one account at a time', async () => {
    network = () => page('a1', 'hers');
    await open('/clubs/oak/sit');
    await open('/clubs/oak/board');
    network = () => page('b2', 'his');
    await open('/clubs/oak/sit');
    network = offline;
    expect(kept().map(([name]) => name)).toEqual(['windrest-pages-b2']);
    expect(await open('/clubs/oak/board')).toContain('No signal');
  });

  it('forgets all when asked, when the sign-in page is shown, and what was being fetched meanwhile', async () => {
    network = () => page('a1', 'hers');
    await open('/clubs/oak/sit');
    await fire('message', { data: { type: 'forget' }, ports: [] });
    expect(kept()).toEqual([]);
    await open('/clubs/oak/sit');
    network = () => new Response('<html lang="en">Sign in</html>');
    await open('/sign-in');
    expect(kept()).toEqual([]);
    network = async () => {
      await fire('message', { data: { type: 'forget' }, ports: [] });
      return page('a1', 'late');
    };
    await open('/clubs/oak/sit');
    expect(kept()).toEqual([]);
  });

  it('fetches ahead the pages, what their links lead to, and the scripts that scripts ask for', async () => {
    network = (url) => {
      if (url.endsWith('/one.js')) return new Response('load("static/chunks/two.js")');
      if (url.endsWith('.js')) return new Response('1');
      const links = '<a href="/clubs/oak/stands/std_1"></a><a href="/clubs/oak/stands/new"></a>';
      return page('a1', `<script src="/_next/static/chunks/one.js"></script>${links}`);
    };
    const pages = [
      {
        path: '/clubs/oak/stands',
        maxAgeMs: 60_000,
        follow: { under: '/clubs/oak/stands/', most: 9, maxAgeMs: 60_000 },
      },
    ];
    await warm(pages);
    expect(asked.sort()).toEqual([
      '/_next/static/chunks/one.js',
      '/_next/static/chunks/two.js',
      '/clubs/oak/stands',
      '/clubs/oak/stands/std_1',
    ]);
    await warm(pages);
    expect(asked).toHaveLength(4);
    network = offline;
    expect(await open('/clubs/oak/stands/std_1')).toContain('data-kept');
  });

  it('keeps ahead what lies behind the first rows of a list, and answers with it without signal', async () => {
    const address = (id: string) => `/api/clubs/oak/sits/std_${id}?day=2026-11-07&window=morning`;
    const read = (path: string) =>
      fire('fetch', { request: { method: 'GET', mode: 'cors', url: ORIGIN + path } }).then((r) => r?.text());
    const rows = ['1', '2', '3'].map((id) => `<li data-detail="${address(id).replaceAll('&', '&amp;')}"></li>`);
    network = (url) => (url.includes('/api/') ? Response.json({ stand: url.slice(-40) }) : page('a1', rows.join('')));
    const pages = [{ path: '/clubs/oak/sit', maxAgeMs: 60_000, details: { most: 2, maxAgeMs: 60_000 } }];
    await warm(pages);
    expect(asked).toEqual(['/clubs/oak/sit', address('1'), address('2')]);
    await warm(pages);
    expect(asked).toHaveLength(3);
    network = offline;
    expect(await read(address('2'))).toContain('std_2');
    expect(await fire('fetch', { request: { method: 'GET', mode: 'cors', url: ORIGIN + address('3') } })).toMatchObject(
      {
        type: 'error',
      },
    );
    network = () => Response.json({ stand: 'anew' });
    expect(await read(address('2'))).toContain('anew');
    network = offline;
    expect(await read(address('2'))).toContain('anew');
    network = () => new Response('<html lang="en">Sign in</html>');
    await open('/sign-in');
    network = offline;
    expect(kept()).toEqual([]);
    expect(await fire('fetch', { request: { method: 'GET', mode: 'cors', url: ORIGIN + address('2') } })).toMatchObject(
      {
        type: 'error',
      },
    );
  });

  it('keeps no read before a page has named the account', async () => {
    network = () => Response.json({ stand: 'x' });
    await fire('fetch', { request: { method: 'GET', mode: 'cors', url: `${ORIGIN}/api/clubs/oak/sits/std_1?day=a` } });
    expect(kept()).toEqual([]);
  });

  it('leads from the first page to the kept list', async () => {
    network = () => page('a1', 'Oak Ladder');
    await open('/clubs/oak/sit');
    network = offline;
    const answer = await fire('fetch', { request: { method: 'GET', mode: 'navigate', url: `${ORIGIN}/` } });
    expect(answer?.headers.get('location')).toBe(`${ORIGIN}/clubs/oak/sit`);
  });

  it('lets alone what is sent, and other places', async () => {
    network = () => page('a1', 'x');
    await fire('fetch', { request: { method: 'POST', mode: 'cors', url: `${ORIGIN}/clubs/oak/sit` } });
    await fire('fetch', { request: { method: 'GET', mode: 'navigate', url: 'https://else.test/' } });
    expect(asked).toEqual([]);
  });
});
