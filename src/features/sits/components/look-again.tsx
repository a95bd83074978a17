'use client';

import { useRouter } from 'next/navigation';
import { type ReactNode, useCallback, useEffect, useRef, useState } from 'react';
import { getJson } from '@/lib/get-json';
import { Button } from '@/ui/button';
import { OLD_LIST_WORDS } from '../words/rows';

/** A list looked at again sooner than this stays as it is. */
const FRESH_MS = 30_000;

interface LookAgainProps {
  /** The read that the page was drawn from. */
  address: string;
  mark: string;
  /** When the list was made, ms. */
  madeAt: number;
  /** Says that the list may be old. */
  old: ReactNode;
}

/** Looks, when the page is come back to, whether its list has changed; only then is the page drawn anew. */
export function LookAgain({ address, mark, madeAt, old }: LookAgainProps) {
  const router = useRouter();
  const [failed, setFailed] = useState(false);
  const lookedAt = useRef(madeAt);
  const look = useCallback(async () => {
    lookedAt.current = Date.now();
    try {
      const now = await getJson<{ mark: string }>(address);
      setFailed(false);
      if (now.mark !== mark) router.refresh();
    } catch {
      setFailed(true);
    }
  }, [address, mark, router]);
  useEffect(() => {
    const back = () => {
      if (document.visibilityState === 'visible' && Date.now() - lookedAt.current > FRESH_MS) void look();
    };
    document.addEventListener('visibilitychange', back);
    return () => document.removeEventListener('visibilitychange', back);
  }, [look]);
  if (!failed) return null;
  return (
    <div>
      {old}
      <Button className="mt-2" onClick={look}>
        {OLD_LIST_WORDS.again}
      </Button>
    </div>
  );
}
