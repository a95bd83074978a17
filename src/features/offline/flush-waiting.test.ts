import { describe, expect, it } from 'vitest';
import type { ActionResult } from '@/server/doors';
import { sendOrKeep } from '@/ui/offline/send-or-keep';
import type { WaitingItem } from '@/ui/offline/waiting-store';
import { flushWaiting } from './flush-waiting';

function memoryStore(first: WaitingItem[] = []) {
  const rows = new Map(first.map((item) => [item.key, item]));
  return {
    rows,
    list: async () => [...rows.values()].sort((a, b) => a.at - b.at),
    put: async (item: WaitingItem) => void rows.set(item.key, item),
    drop: async (key: string) => void rows.delete(key),
  };
}

const item = (key: string, at: number, more: Partial<WaitingItem> = {}): WaitingItem => ({
  key,
  account: 'ann',
  club: 'oak',
  kind: 'sign_in',
  label: key,
  values: {},
  at,
  refused: null,
  ...more,
});

const OK: ActionResult<null> = { ok: true, data: null };
const no = (code: 'conflict' | 'signed_out', message: string): ActionResult<never> => ({
  ok: false,
  error: { code, message },
});

describe('sending what waits', () => {
  it('goes in the order of the presses and empties the list', async () => {
    const store = memoryStore([item('out', 2), item('in', 1)]);
    const seen: string[] = [];
    const done = await flushWaiting(store, 'ann', async ({ key }) => {
      seen.push(key);
      return OK;
    });
    expect(seen).toEqual(['in', 'out']);
    expect(done.sent.map(({ key }) => key)).toEqual(['in', 'out']);
    expect(store.rows.size).toBe(0);
  });

  it('stops at the first that finds no server, and keeps it and the rest', async () => {
    const store = memoryStore([item('a', 1), item('b', 2), item('c', 3)]);
    const done = await flushWaiting(store, 'ann', async ({ key }) => {
      if (key === 'b') throw new TypeError('Failed to fetch');
      return OK;
    });
    expect(done).toMatchObject({ sent: [{ key: 'a' }], held: null });
    expect([...store.rows.keys()]).toEqual(['b', 'c']);
  });

  it('keeps a refusal with its words, goes on, and does not send it again', async () => {
    const store = memoryStore([item('a', 1), item('b', 2)]);
    let sendings = 0;
    const send = async ({ key }: WaitingItem) => {
      sendings += 1;
      return key === 'a' ? no('conflict', 'This sit was cancelled. Book it anew.') : OK;
    };
    await flushWaiting(store, 'ann', send);
    await flushWaiting(store, 'ann', send);
    expect(sendings).toBe(2);
    expect(store.rows.get('a')?.refused).toBe('This sit was cancelled. Book it anew.');
    expect(store.rows.has('b')).toBe(false);
  });

  it('holds everything, with the reason, while one is signed out', async () => {
    const store = memoryStore([item('a', 1)]);
    const done = await flushWaiting(store, 'ann', async () => no('signed_out', 'Sign in to go on.'));
    expect(done.held).toBe('Sign in to go on.');
    expect(store.rows.get('a')?.refused).toBeNull();
  });

  it("never sends another account's presses", async () => {
    const store = memoryStore([item('a', 1, { account: 'bert' })]);
    const done = await flushWaiting(store, 'ann', async () => OK);
    expect(done.sent).toEqual([]);
  });
});

describe('a press', () => {
  const never = () => new Promise<null>(() => undefined);
  const tools = (store: ReturnType<typeof memoryStore>, more: object = {}) => ({
    account: 'ann',
    store,
    online: () => true,
    now: () => 1000,
    newKey: () => 'key-1',
    patience: never,
    ...more,
  });
  const press = (send: (values: object) => Promise<ActionResult<string>>) => ({
    kind: 'sign_in',
    club: 'oak',
    label: 'Sign in at Oak Ladder',
    values: { sitId: 'sit_1' },
    send,
  });

  it('goes to the server with its key and time, and a refusal comes straight back', async () => {
    const store = memoryStore();
    let got: object = {};
    const send = async (values: object) => {
      got = values;
      return no('conflict', 'Taken.');
    };
    expect(await sendOrKeep(press(send), tools(store))).toMatchObject({ ok: false });
    expect(got).toEqual({ sitId: 'sit_1', sent: { key: 'key-1', at: 1000 } });
    expect(store.rows.size).toBe(0);
  });

  it('is kept under the very key it was sent with when the answer is lost', async () => {
    const store = memoryStore();
    const lost = async () => Promise.reject(new TypeError('Failed to fetch'));
    expect(await sendOrKeep(press(lost), tools(store))).toEqual({ ok: true, data: null });
    expect(store.rows.get('key-1')).toMatchObject({ values: { sent: { key: 'key-1', at: 1000 } }, refused: null });
  });

  it('is kept without a try when there is no signal, or when the server does not answer', async () => {
    const store = memoryStore();
    let tries = 0;
    const send = async () => {
      tries += 1;
      return new Promise<ActionResult<string>>(() => undefined);
    };
    await sendOrKeep(press(send), tools(store, { online: () => false }));
    expect(tries).toBe(0);
    store.rows.clear();
    await sendOrKeep(press(send), tools(store, { patience: async () => null }));
    expect([tries, store.rows.size]).toEqual([1, 1]);
  });

  it('waits behind what waits already', async () => {
    const store = memoryStore([item('in', 1)]);
    let tries = 0;
    await sendOrKeep(
      press(async () => {
        tries += 1;
        return { ok: true, data: 'x' };
      }),
      tools(store),
    );
    expect(tries).toBe(0);
    expect([...store.rows.keys()]).toEqual(['in', 'key-1']);
  });

  it('fails aloud when it can be neither sent nor kept', async () => {
    const lost = async () => Promise.reject(new TypeError('Failed to fetch'));
    await expect(sendOrKeep(press(lost), tools(memoryStore(), { account: null }))).rejects.toThrow('Not sent');
  });
});
