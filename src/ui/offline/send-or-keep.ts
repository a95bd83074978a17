import type { Sent } from '@/lib/sent-schema';
import type { ActionAnswer } from '../form/use-action-form';
import type { WaitingItem, WaitingStore } from './waiting-store';

export interface Press<V extends object, T> {
  kind: string;
  club: string;
  /** What the list of waiting presses calls it. */
  label: string;
  values: V;
  send: (values: V & { sent: Sent }) => Promise<ActionAnswer<T>>;
}

export interface SendTools {
  account: string | null;
  store: Pick<WaitingStore, 'list' | 'put'>;
  online: () => boolean;
  now: () => number;
  newKey: () => string;
  /** Resolves to null when an answer is waited for no longer. */
  patience: () => Promise<null>;
}

/**
 * Sends a press, or keeps it when the server is not reached: then the answer's data is null. Whatever waits already goes
 * first, so that signing in is never overtaken by signing out. Rejects when it can be neither sent nor kept.
 */
export async function sendOrKeep<V extends object, T>(
  press: Press<V, T>,
  tools: SendTools,
): Promise<ActionAnswer<T | null>> {
  const { account, store } = tools;
  const sent: Sent = { key: tools.newKey(), at: tools.now() };
  const values = { ...press.values, sent };
  const waiting = account === null ? [] : await store.list().catch((): WaitingItem[] => []);
  if (tools.online() && waiting.every((item) => item.refused !== null)) {
    const answer = await Promise.race([press.send(values).catch(() => null), tools.patience()]);
    if (answer) return answer;
  }
  if (account === null) throw new Error('Not sent, and there is no account to keep it under.');
  const { kind, club, label } = press;
  await store.put({ key: sent.key, account, club, kind, label, values, at: sent.at, refused: null });
  return { ok: true, data: null };
}
