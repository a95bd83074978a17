'use client';

import { useEffect, useState } from 'react';
import { formatDay } from '@/core/day-time';
import { TextLink } from '@/ui/button';
import { type KeptWindow, keepWindow, readKeptWindow } from '../remember';
import { sitAddress } from '../sit-address';
import type { SitsView } from '../view-types';
import { WINDOW_WORDS } from '../words';

interface BackToWindowProps {
  view: SitsView;
  /** The address names no window: the next one is shown. */
  isNext: boolean;
}

/** Opens on the next window as always, and offers the one ahead that was looked at before. */
export function BackToWindow({ view, isNext }: BackToWindowProps) {
  const [back, setBack] = useState<KeptWindow | null>(null);
  const { club, window, madeAt } = view;
  useEffect(() => {
    if (!isNext) return keepWindow(club.slug, window);
    const kept = readKeptWindow(club.slug);
    const another = kept && (kept.day !== window.day || kept.window !== window.window);
    setBack(another && kept.startAt > madeAt ? kept : null);
  }, [club.slug, window, isNext, madeAt]);
  if (!back) return null;
  return (
    <p className="text-sm print:hidden">
      <TextLink href={sitAddress(club.slug, { day: back.day, window: back.window })}>
        Back to {formatDay(back.day)}, {WINDOW_WORDS[back.window]}
      </TextLink>
    </p>
  );
}
