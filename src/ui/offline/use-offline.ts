'use client';

import { useCallback, useEffect, useState, useSyncExternalStore } from 'react';
import { newRequestKey } from '@/lib/request-key';
import { useKeptAccount } from './account';
import { type Press, sendOrKeep } from './send-or-keep';
import { onWaitingChange, type WaitingItem, waitingStore } from './waiting-store';

/** A signal of one bar may never answer. */
const PATIENCE_MS = 15_000;

export const KEPT_TOAST = { title: 'Kept on this device', text: 'It is sent as soon as there is a signal.' };

export function useSendOrKeep() {
  const account = useKeptAccount();
  return useCallback(
    <V extends object, T>(press: Press<V, T>) =>
      sendOrKeep(press, {
        account,
        store: waitingStore,
        online: () => navigator.onLine,
        now: () => Date.now(),
        newKey: newRequestKey,
        patience: () => new Promise((done) => setTimeout(done, PATIENCE_MS, null)),
      }),
    [account],
  );
}

/** This account's presses that wait on this device. */
export function useWaiting(): WaitingItem[] {
  const account = useKeptAccount();
  const [items, setItems] = useState<WaitingItem[]>([]);
  useEffect(() => {
    if (account === null) return;
    let gone = false;
    const read = () =>
      void waitingStore
        .list()
        .then((all) => gone || setItems(all.filter((item) => item.account === account)))
        .catch(() => undefined);
    read();
    const stop = onWaitingChange(read);
    return () => {
      gone = true;
      stop();
    };
  }, [account]);
  return items;
}

function onSignal(call: () => void): () => void {
  window.addEventListener('online', call);
  window.addEventListener('offline', call);
  return () => {
    window.removeEventListener('online', call);
    window.removeEventListener('offline', call);
  };
}

export const useOnline = (): boolean =>
  useSyncExternalStore(
    onSignal,
    () => navigator.onLine,
    () => true,
  );
