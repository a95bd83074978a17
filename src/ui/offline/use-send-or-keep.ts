'use client';

import { useCallback } from 'react';
import { newRequestKey } from '@/lib/request-key';
import { KEPT_WORDS } from '../words/offline';
import { useKeptAccount } from './account';
import { type Press, sendOrKeep } from './send-or-keep';
import { waitingStore } from './waiting-store';

/** A signal of one bar may never answer. */
const PATIENCE_MS = 15_000;

export const KEPT_TOAST = KEPT_WORDS;

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
