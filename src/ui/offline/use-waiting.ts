'use client';

import { useEffect, useState } from 'react';
import { useKeptAccount } from './account';
import { onWaitingChange, type WaitingItem, waitingStore } from './waiting-store';

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
