'use client';

import { type ComponentType, useEffect, useState } from 'react';
import { useWaiting } from '@/ui/offline/use-waiting';
import type { WaitingPanelProps } from './waiting-panel';

/** Most pages have nothing that waits: what shows and sends it comes only where there is. */
export function LateWaiting(props: WaitingPanelProps) {
  const waits = useWaiting().length > 0;
  const [Panel, setPanel] = useState<ComponentType<WaitingPanelProps> | null>(null);
  useEffect(() => {
    if (!waits || Panel) return;
    const load = () =>
      import('./waiting-panel').then(
        (parts) => setPanel(() => parts.WaitingPanel),
        () => undefined,
      );
    void load();
    window.addEventListener('online', load);
    return () => window.removeEventListener('online', load);
  }, [waits, Panel]);
  return waits && Panel && <Panel {...props} />;
}
