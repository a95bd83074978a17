import { waitingStore } from './waiting-store';

const PAGE_CACHES = 'windrest-pages-';
const PATIENCE_MS = 3000;

async function askWorker(): Promise<void> {
  const worker = navigator.serviceWorker?.controller;
  if (!worker) return;
  await new Promise<void>((done) => {
    const { port1, port2 } = new MessageChannel();
    port1.onmessage = () => done();
    worker.postMessage({ type: 'forget' }, [port2]);
    setTimeout(done, PATIENCE_MS);
  });
}

async function dropPages(): Promise<void> {
  if (!('caches' in window)) return;
  const names = (await caches.keys()).filter((name) => name.startsWith(PAGE_CACHES));
  await Promise.all(names.map((name) => caches.delete(name)));
}

/** Empties this device of the account: pages, presses that waited, drafts. For signing out; never rejects. */
export async function forgetKept(): Promise<void> {
  await askWorker().catch(() => undefined);
  await dropPages().catch(() => undefined);
  await waitingStore.clear().catch(() => undefined);
  try {
    window.sessionStorage.clear();
  } catch {
    // A browser that keeps its store shut has nothing to drop.
  }
}
