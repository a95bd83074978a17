import { useEffect, useRef, useState } from 'react';
import type { BeginWatch, Watch, Watched } from './watch-query';
import { whenIdle } from './when-idle';
import { WATCH_WORDS } from './words/late';

const AGAIN_MS = 15_000;

/**
 * What the server has drawn, kept fresh from then on: the script that asks comes once the page is there. A newer `first`,
 * as any action brings it, is shown at once.
 */
export function useWatched<T>(load: () => Promise<BeginWatch<T>>, first: T): Watched<T> & { again: () => void } {
  const [seen, setSeen] = useState<Watched<T>>({ data: first, error: null });
  const watch = useRef<Watch<T> | null>(null);
  const newest = useRef(first);
  const fetchBegin = useRef(load);

  useEffect(() => {
    let gone = false;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const start = async () => {
      try {
        const begin = await fetchBegin.current();
        if (!gone) watch.current = begin(newest.current, setSeen);
      } catch {
        if (gone) return;
        setSeen((now) => ({ ...now, error: new Error(WATCH_WORDS.lost) }));
        timer = setTimeout(start, AGAIN_MS);
      }
    };
    const callOff = whenIdle(() => void start());
    return () => {
      gone = true;
      callOff();
      clearTimeout(timer);
      watch.current?.stop();
      watch.current = null;
    };
  }, []);

  useEffect(() => {
    if (newest.current === first) return;
    newest.current = first;
    if (watch.current) watch.current.put(first);
    else setSeen({ data: first, error: null });
  }, [first]);

  return { ...seen, again: () => watch.current?.again() };
}
