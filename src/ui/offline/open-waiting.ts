export const WAITING_STORE = 'waiting';

/** Opens the browser's database of waiting presses; rejects where a browser keeps it shut. */
export function openWaiting(): Promise<IDBDatabase> {
  return new Promise((done, fail) => {
    const request = indexedDB.open('windrest', 1);
    request.onupgradeneeded = () => request.result.createObjectStore(WAITING_STORE, { keyPath: 'key' });
    request.onsuccess = () => done(request.result);
    request.onerror = () => fail(request.error);
    request.onblocked = () => fail(new Error('The database is in use.'));
  });
}
