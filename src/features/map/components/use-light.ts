'use client';

import { useEffect, useState } from 'react';

/** Changes whenever the light of the page does: the switch, or the system between day and night. */
export function useLight(): number {
  const [count, setCount] = useState(0);
  useEffect(() => {
    const more = () => setCount((n) => n + 1);
    const watcher = new MutationObserver(more);
    watcher.observe(document.documentElement, { attributes: true, attributeFilter: ['data-light'], subtree: true });
    const dark = window.matchMedia('(prefers-color-scheme: dark)');
    dark.addEventListener('change', more);
    return () => {
      watcher.disconnect();
      dark.removeEventListener('change', more);
    };
  }, []);
  return count;
}
