'use client';

import { useEffect, useState } from 'react';
import { NoSignalSign } from '../signs';
import { OFFLINE_WORDS } from '../words/offline';
import { useOnline } from './use-online';

/** Says that there is no signal, or that this page is a kept copy, and of when it is. */
export function OfflineMark({ asOf }: { asOf: string }) {
  const online = useOnline();
  const [keptAsOf, setKeptAsOf] = useState<string | null>(null);
  // The worker marks a copy it shows; a page fetched anew carries another time.
  // biome-ignore lint/correctness/useExhaustiveDependencies: only what the page was when it was opened
  useEffect(() => {
    if (document.documentElement.dataset.kept !== undefined) setKeptAsOf(asOf);
  }, []);
  const old = keptAsOf === asOf;
  if (online && !old) return null;
  return (
    <p role="status" className="flex items-center gap-1.5 border border-rule-strong px-2 py-1 text-xs leading-tight">
      <NoSignalSign className="size-4 shrink-0" />
      <span>
        <strong className="font-semibold">{online ? OFFLINE_WORDS.kept : OFFLINE_WORDS.noSignal}</strong>
        {OFFLINE_WORDS.asOf}
        <span className="whitespace-nowrap">{asOf}</span>
      </span>
    </p>
  );
}
