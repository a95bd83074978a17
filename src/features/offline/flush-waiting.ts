import type { ActionResult } from '@/server/doors';
import type { WaitingItem, WaitingStore } from '@/ui/offline/waiting-store';

/** The server is there and cannot take it now; anything else it says is about the press itself. */
const LATER = ['signed_out', 'limit', 'unavailable', 'internal'];

export type SendItem = (item: WaitingItem) => Promise<ActionResult<unknown>>;

export interface Flushed {
  sent: WaitingItem[];
  /** Why the rest still waits; null: nothing does, or there is no signal. */
  held: string | null;
}

function wordsOf(error: { message: string; fields?: Record<string, string> }): string {
  const fields = Object.values(error.fields ?? {}).filter((text) => text !== error.message);
  return [error.message, ...fields].join(' ');
}

/** Sends what waits, in the order of the presses, and stops at the first that finds no server. A refusal stays to be read. */
export async function flushWaiting(
  store: Pick<WaitingStore, 'list' | 'put' | 'drop'>,
  account: string,
  send: SendItem,
): Promise<Flushed> {
  const sent: WaitingItem[] = [];
  for (const item of await store.list()) {
    if (item.account !== account || item.refused !== null) continue;
    const answer = await send(item).catch(() => null);
    if (!answer) return { sent, held: null };
    if (answer.ok) {
      await store.drop(item.key);
      sent.push(item);
    } else if (LATER.includes(answer.error.code)) {
      return { sent, held: answer.error.message };
    } else {
      await store.put({ ...item, refused: wordsOf(answer.error) });
    }
  }
  return { sent, held: null };
}
