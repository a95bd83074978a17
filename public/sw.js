/* Keeps what a member reads in the woods. Plain script, served as it is: no bundler stands between a phone and its repair. */
const STATIC = 'windrest-static';
const PAGES = 'windrest-pages-';
/** How long a person waits for the network when a kept copy is at hand. */
const PATIENCE_MS = 4000;
const MOST_PAGES = 150;
const MOST_READS = 60;
const MOST_FILES = 600;
const MOST_AT_ONCE = 300;

/** Pages that are read without signal; every other page needs one. */
const READABLE =
  /^\/clubs\/[a-z0-9-]+\/(sit|week|my-sits|board|board\/gate-sheet|stands|stands\/std_\w+|log|log\/sit_\w+|log\/visits\/new)$/;
/** Reads that a kept page asks for: what lies behind a row of the list. The page names them in `data-detail`. */
const READS = /^\/api\/clubs\/[a-z0-9-]+\/sits\/std_\w+$/;
const DETAILS = /data-detail="([^"]+)"/g;
const FIRST_PAGES = /^\/(clubs(\/[a-z0-9-]+)?)?$/;
const ACCOUNT = /data-account="([\w-]+)"/;
const FILES = /\/_next\/(static\/[\w./~%@[\]-]+\.(?:js|css|woff2))/g;
const CHUNKS = /["'/](static\/chunks\/[\w./~%@[\]-]+\.(?:js|css))/g;

/** Raised when everything is forgotten, so that nothing fetched before is kept after. */
let generation = 0;
let warming = null;
/** Files that are kept with all they lead to. */
const scanned = new Set();

self.addEventListener('install', () => self.skipWaiting());
self.addEventListener('activate', (event) => event.waitUntil(self.clients.claim()));

const pageCaches = async () => (await caches.keys()).filter((name) => name.startsWith(PAGES));
const addressOf = (url) => url.origin + url.pathname + url.search;

async function forget() {
  generation += 1;
  await Promise.all((await pageCaches()).map((name) => caches.delete(name)));
}

const isRead = (key) => READS.test(new URL(key.url).pathname);

/** Cuts what a cache has of one kind back to its newest entries. */
async function trim(cache, most, ofKind = () => true) {
  const keys = (await cache.keys()).filter(ofKind);
  await Promise.all(keys.slice(0, Math.max(0, keys.length - most)).map((key) => cache.delete(key)));
}

/** Scripts, styles and fonts a page names, and those that its scripts fetch later: a dialog opens without signal too. */
async function keepFiles(html) {
  const cache = await caches.open(STATIC);
  const todo = [...html.matchAll(FILES)].map(([, path]) => path);
  const seen = new Set();
  while (todo.length > 0 && seen.size < MOST_AT_ONCE) {
    const path = todo.pop();
    if (seen.has(path) || scanned.has(path)) continue;
    seen.add(path);
    const address = `/_next/${path}`;
    let file = await cache.match(address);
    if (!file) {
      file = await fetch(address);
      if (!file.ok) continue;
      await cache.put(address, file.clone());
    }
    if (path.endsWith('.js')) for (const [, more] of (await file.text()).matchAll(CHUNKS)) todo.push(more);
    scanned.add(path);
  }
  await trim(cache, MOST_FILES);
}

/** Keeps a page under the account it names. One account at a time: another's pages go first. */
async function keepPage(url, html, born) {
  const account = ACCOUNT.exec(html)?.[1];
  if (!account || !READABLE.test(url.pathname) || born !== generation) return false;
  const name = PAGES + account;
  for (const other of await pageCaches()) if (other !== name) await caches.delete(other);
  const cache = await caches.open(name);
  const headers = { 'Content-Type': 'text/html; charset=utf-8', 'X-Kept-At': String(Date.now()) };
  await cache.delete(addressOf(url));
  await cache.put(addressOf(url), new Response(html, { headers }));
  await trim(cache, MOST_PAGES, (key) => !isRead(key));
  if (born !== generation) await caches.delete(name);
  return born === generation;
}

/** Keeps a read beside the pages of the account that is signed in; without any, nobody's. */
async function keepRead(url, answer, born) {
  const json = await answer.text();
  const [name] = await pageCaches();
  if (!name || born !== generation) return;
  const cache = await caches.open(name);
  const headers = { 'Content-Type': 'application/json', 'X-Kept-At': String(Date.now()) };
  await cache.delete(addressOf(url));
  await cache.put(addressOf(url), new Response(json, { headers }));
  await trim(cache, MOST_READS, isRead);
  if (born !== generation) await caches.delete(name);
}

async function findKept(url, loosely) {
  const [name] = await pageCaches();
  if (!name) return undefined;
  const cache = await caches.open(name);
  return (await cache.match(addressOf(url))) ?? (loosely ? cache.match(addressOf(url), { ignoreSearch: true }) : undefined);
}

async function keptAddresses() {
  const [name] = await pageCaches();
  return name ? (await (await caches.open(name)).keys()).map((request) => new URL(request.url)) : [];
}

/** The kept copy, marked as one so that the page can say so. */
async function showKept(kept) {
  const html = (await kept.text()).replace('<html ', '<html data-kept="" ');
  return new Response(html, { headers: { 'Content-Type': 'text/html; charset=utf-8', 'Cache-Control': 'no-store' } });
}

/** In place of a page that cannot be fetched; null: nothing stands in. */
async function standIn(url) {
  if (READABLE.test(url.pathname)) {
    const kept = await findKept(url, true);
    if (kept) return showKept(kept);
  }
  if (!FIRST_PAGES.test(url.pathname)) return null;
  const sit = (await keptAddresses()).find(({ pathname }) => pathname.endsWith('/sit') && pathname.startsWith(url.pathname));
  return sit ? Response.redirect(sit.origin + sit.pathname, 302) : null;
}

const NAMES = { sit: 'Sit', week: 'Week', 'my-sits': 'My sits', board: 'Board', stands: 'Stands', log: 'Log' };

async function sayNoSignal() {
  const links = (await keptAddresses()).flatMap(({ pathname, search }) => {
    const name = NAMES[pathname.split('/').slice(3).join('/')];
    return name && !search ? [`<li><a href="${pathname}">${name}</a></li>`] : [];
  });
  const kept = links.length > 0 ? `<p>Kept on this device:</p><ul>${links.join('')}</ul>` : '';
  const html = `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>No signal · Windrest</title>
<meta name="viewport" content="width=device-width, initial-scale=1"><meta name="color-scheme" content="light dark"></head>
<body style="font:1.1rem/1.6 Georgia,serif;margin:2rem;max-width:34rem"><main><h1>No signal</h1>
<p>This page has not been kept on this device. It comes when there is a signal: load it again then.</p>${kept}</main></body></html>`;
  return new Response(html, { status: 503, headers: { 'Content-Type': 'text/html; charset=utf-8' } });
}

async function fetchPage(event, url) {
  const born = generation;
  const answer = await fetch(event.request);
  if (!answer.ok || answer.type !== 'basic') return answer;
  // This page is shown only to those who are signed out.
  if (url.pathname === '/sign-in') await forget();
  else if (READABLE.test(url.pathname)) {
    const copy = answer.clone();
    event.waitUntil(copy.text().then((html) => keepPage(url, html, born)));
  }
  return answer;
}

const wait = (ms) => new Promise((done) => setTimeout(done, ms, null));

async function openPage(event) {
  const url = new URL(event.request.url);
  const fresh = fetchPage(event, url);
  const settled = fresh.catch(() => null);
  event.waitUntil(settled);
  const first = await Promise.race([settled, wait(PATIENCE_MS)]);
  if (first) return first;
  return (await standIn(url)) ?? (await settled) ?? sayNoSignal();
}

async function openRead(event) {
  const url = new URL(event.request.url);
  const born = generation;
  const settled = fetch(event.request).then(
    (answer) => {
      if (answer.ok) event.waitUntil(keepRead(url, answer.clone(), born));
      return answer;
    },
    () => null,
  );
  event.waitUntil(settled);
  const first = await Promise.race([settled, wait(PATIENCE_MS)]);
  return first ?? (await findKept(url, false)) ?? (await settled) ?? Response.error();
}

async function openFile(request) {
  const cache = await caches.open(STATIC);
  const kept = await cache.match(request.url);
  if (kept) return kept;
  const answer = await fetch(request);
  if (answer.ok) await cache.put(request.url, answer.clone());
  return answer;
}

self.addEventListener('fetch', (event) => {
  const { request } = event;
  const url = new URL(request.url);
  if (request.method !== 'GET' || url.origin !== self.location.origin) return;
  if (url.pathname.startsWith('/_next/static/')) event.respondWith(openFile(request));
  else if (request.mode === 'navigate') event.respondWith(openPage(event));
  else if (READS.test(url.pathname)) event.respondWith(openRead(event));
});

/** Fetches a page unless its kept copy is young enough; gives what it says, or null. */
async function freshen(path, maxAgeMs) {
  const url = new URL(path, self.location.origin);
  const kept = await findKept(url, false);
  if (kept && Date.now() - Number(kept.headers.get('X-Kept-At')) < maxAgeMs) return kept.text();
  const born = generation;
  const answer = await fetch(url.href, { cache: 'no-store', credentials: 'same-origin' });
  if (!answer.ok || answer.redirected) return null;
  const html = await answer.text();
  return (await keepPage(url, html, born)) ? html : null;
}

/** Reads that a page names, those not kept lately, one after the other. */
async function warmReads(html, { most, maxAgeMs }, born) {
  const paths = [...html.matchAll(DETAILS)].map(([, path]) => path.replaceAll('&amp;', '&'));
  for (const path of paths.slice(0, most)) {
    const url = new URL(path, self.location.origin);
    const kept = await findKept(url, false);
    if (born !== generation || !READS.test(url.pathname)) return;
    if (kept && Date.now() - Number(kept.headers.get('X-Kept-At')) < maxAgeMs) continue;
    const answer = await fetch(url.href, { credentials: 'same-origin' });
    if (answer.ok) await keepRead(url, answer, born);
  }
}

/** Ahead of need, one after the other: pages, the files they use, and the pages their links lead to. */
async function warm(pages) {
  const born = generation;
  for (const { path, maxAgeMs, follow, details } of pages) {
    if (born !== generation) return;
    const html = await freshen(path, maxAgeMs);
    if (!html) continue;
    await keepFiles(html);
    if (details) await warmReads(html, details, born);
    if (!follow) continue;
    const links = new Set([...html.matchAll(/href="(\/[^"?#]+)"/g)].map(([, href]) => href));
    const wanted = [...links].filter((href) => href.startsWith(follow.under) && READABLE.test(href));
    for (const href of wanted.slice(0, follow.most)) {
      if (born !== generation) return;
      const more = await freshen(href, follow.maxAgeMs);
      if (more) await keepFiles(more);
    }
  }
}

self.addEventListener('message', (event) => {
  const { type, pages } = event.data ?? {};
  if (type === 'forget') event.waitUntil(forget().then(() => event.ports[0]?.postMessage('forgotten')));
  if (type !== 'keep' || !Array.isArray(pages) || warming) return;
  // Without signal it simply stops; the next look at a page begins it again.
  warming = warm(pages)
    .catch(() => undefined)
    .finally(() => {
      warming = null;
    });
  event.waitUntil(warming);
});
