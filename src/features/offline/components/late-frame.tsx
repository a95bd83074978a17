'use client';

import { type ComponentType, useEffect, useState } from 'react';
import { whenIdle } from '@/ui/when-idle';
import type { FramePartsProps } from './frame-parts';

/** What the frame of a club's pages does besides being seen: it comes once the page itself is there. */
export function LateFrame(props: FramePartsProps) {
  const [Parts, setParts] = useState<ComponentType<FramePartsProps> | null>(null);
  useEffect(() => {
    if (Parts) return;
    const load = () =>
      void import('./frame-parts').then(
        (parts) => setParts(() => parts.FrameParts),
        () => undefined,
      );
    const stop = whenIdle(load);
    window.addEventListener('online', load);
    return () => {
      stop();
      window.removeEventListener('online', load);
    };
  }, [Parts]);
  return Parts && <Parts {...props} />;
}
