'use client';

import { useRouter } from 'next/navigation';
import { useEffect } from 'react';
import { useKeptAccount } from './account';
import { waitingStore } from './waiting-store';

export interface PageToKeep {
  path: string;
  /** A kept copy younger than this is not fetched again. */
  maxAgeMs: number;
  /** Keep the pages too that it links to under this path. */
  follow?: { under: string; most: number; maxAgeMs: number };
  /** Keep too what lies behind the rows it lists, the first so many. */
  details?: { most: number; maxAgeMs: number };
}

async function startKeeping(pages: PageToKeep[]): Promise<void> {
  if (!('serviceWorker' in navigator) || !navigator.onLine) return;
  await navigator.serviceWorker.register('/sw.js', { updateViaCache: 'none' });
  const ready = await navigator.serviceWorker.ready;
  ready.active?.postMessage({ type: 'keep', pages });
}

/** Keeps pages on this device for when there is no signal, and asks for the open one anew when it is back. */
export function KeepPages({ pages }: { pages: PageToKeep[] }) {
  const router = useRouter();
  const account = useKeptAccount();
  // biome-ignore lint/correctness/useExhaustiveDependencies: the list says the same for the same club
  useEffect(() => {
    if (account === null) return;
    void waitingStore.keepOnly(account).catch(() => undefined);
    const keep = () => void startKeeping(pages).catch(() => undefined);
    const look = () => document.visibilityState === 'visible' && keep();
    const back = () => {
      router.refresh();
      keep();
    };
    // After the page itself has all it needs of a poor signal.
    if (document.readyState === 'complete') keep();
    else window.addEventListener('load', keep, { once: true });
    window.addEventListener('online', back);
    document.addEventListener('visibilitychange', look);
    return () => {
      window.removeEventListener('load', keep);
      window.removeEventListener('online', back);
      document.removeEventListener('visibilitychange', look);
    };
  }, [account, pages[0]?.path, router]);
  return null;
}
