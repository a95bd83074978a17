import { openWaiting, WAITING_STORE } from './open-waiting';

/** One press that waits for a signal. */
export interface WaitingItem {
  /** Sent along, so that the server does it once. */
  key: string;
  account: string;
  club: string;
  kind: string;
  /** 'Sign in at Oak Ladder' */
  label: string;
  values: object;
  /** When it was pressed. */
  at: number;
  /** Why the server would not have it; null: not sent yet. */
  refused: string | null;
}

export interface WaitingStore {
  /** In the order of the presses. */
  list: () => Promise<WaitingItem[]>;
  put: (item: WaitingItem) => Promise<void>;
  drop: (key: string) => Promise<void>;
  /** Drops what belongs to any other account. */
  keepOnly: (account: string) => Promise<void>;
  clear: () => Promise<void>;
}

const CHANGED = 'windrest:waiting';

const tell = () => window.dispatchEvent(new Event(CHANGED));

/** Calls back after each change in this tab. */
export function onWaitingChange(call: () => void): () => void {
  window.addEventListener(CHANGED, call);
  return () => window.removeEventListener(CHANGED, call);
}

async function inStore<T>(mode: IDBTransactionMode, work: (store: IDBObjectStore) => IDBRequest<T>): Promise<T> {
  const db = await openWaiting();
  try {
    return await new Promise((done, fail) => {
      const tx = db.transaction(WAITING_STORE, mode);
      const request = work(tx.objectStore(WAITING_STORE));
      tx.oncomplete = () => done(request.result);
      tx.onerror = () => fail(tx.error);
      tx.onabort = () => fail(tx.error);
    });
  } finally {
    db.close();
  }
}

async function list(): Promise<WaitingItem[]> {
  const items: WaitingItem[] = await inStore('readonly', (store) => store.getAll());
  return items.sort((a, b) => a.at - b.at);
}

async function change<T>(work: (store: IDBObjectStore) => IDBRequest<T>): Promise<void> {
  await inStore('readwrite', work);
  tell();
}

/** Kept in the browser's own database: a closed tab or an empty battery loses no press. */
export const waitingStore: WaitingStore = {
  list,
  put: (item) => change((store) => store.put(item)),
  drop: (key) => change((store) => store.delete(key)),
  keepOnly: async (account) => {
    for (const item of await list()) if (item.account !== account) await change((store) => store.delete(item.key));
  },
  clear: () => change((store) => store.clear()),
};
