import { type RefObject, useEffect, useRef, useState } from 'react';
import { flushSync } from 'react-dom';

export interface MoreRows {
  /** How many of the rows to draw. */
  shown: number;
  /** On something below the last row: more are drawn as it comes near. */
  foot: RefObject<HTMLTableSectionElement | null>;
  showAll: () => void;
}

/** Draws a long table a pageful at a time as it is scrolled to, and whole for the printer. */
export function useMoreRows(total: number, atOnce: number): MoreRows {
  const [shown, setShown] = useState(Math.min(total, atOnce));
  const foot = useRef<HTMLTableSectionElement>(null);
  const showAll = () => setShown(total);
  useEffect(() => {
    const mark = foot.current;
    if (!mark || shown >= total) return;
    const watch = new IntersectionObserver(
      ([entry]) => entry?.isIntersecting && setShown((now) => Math.min(total, now + atOnce)),
      { rootMargin: '600px' },
    );
    watch.observe(mark);
    return () => watch.disconnect();
  }, [shown, total, atOnce]);
  useEffect(() => {
    // The page is taken for print as it stands when this returns.
    const all = () => flushSync(() => setShown(total));
    globalThis.addEventListener('beforeprint', all);
    return () => globalThis.removeEventListener('beforeprint', all);
  }, [total]);
  return { shown: Math.min(shown, total), foot, showAll };
}
