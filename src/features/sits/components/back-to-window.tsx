'use client';

import { useEffect, useState } from 'react';
import { TextLink } from '@/ui/button';
import { type KeptWindow, keepWindow, readKeptWindow } from '../remember';
import { sitAddress } from '../sit-address';
import { BACK_WORDS } from '../words/rows';

interface BackToWindowProps {
  club: string;
  window: KeptWindow;
  /** The address names no window: the next one is shown. */
  isNext: boolean;
  madeAt: number;
}

/** Opens on the next window as always, and offers the one ahead that was looked at before. */
export function BackToWindow({ club, window, isNext, madeAt }: BackToWindowProps) {
  const [back, setBack] = useState<KeptWindow | null>(null);
  useEffect(() => {
    if (!isNext) return keepWindow(club, window);
    const kept = readKeptWindow(club);
    const another = kept && (kept.day !== window.day || kept.window !== window.window);
    setBack(another && kept.startAt > madeAt ? kept : null);
  }, [club, window, isNext, madeAt]);
  if (!back) return null;
  return (
    <p className="text-sm print:hidden">
      <TextLink href={sitAddress(club, { day: back.day, window: back.window })}>
        {BACK_WORDS.backTo(back.title)}
      </TextLink>
    </p>
  );
}
