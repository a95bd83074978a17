'use client';

import { useEffect } from 'react';
import { setSunLight } from './set-light';

export interface FollowSunProps {
  /** From when on there is daylight or none, in order; the first holds now. */
  changes: readonly { at: number; light: 'day' | 'dark' }[];
}

const HOUR_MS = 3_600_000;

/** Turns the page from day to dark with the sun, where auto is chosen. Draws nothing. */
export function FollowSun({ changes }: FollowSunProps) {
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const follow = () => {
      clearTimeout(timer);
      const now = Date.now();
      const next = changes.find((change) => change.at > now);
      const current = changes.findLast((change) => change.at <= now) ?? changes[0];
      const left = next ? next.at - now : HOUR_MS;
      if (current) setSunLight(current.light, left);
      if (next) timer = setTimeout(follow, Math.min(left, HOUR_MS));
    };
    follow();
    document.addEventListener('visibilitychange', follow);
    return () => {
      clearTimeout(timer);
      document.removeEventListener('visibilitychange', follow);
    };
  }, [changes]);
  return null;
}
