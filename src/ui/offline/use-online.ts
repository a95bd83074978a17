'use client';

import { useSyncExternalStore } from 'react';

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
