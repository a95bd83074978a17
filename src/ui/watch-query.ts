import { QueryObserver, type QueryObserverOptions } from '@tanstack/react-query';
import { queryClient } from './query';

export interface Watched<T> {
  data: T;
  /** Why the last question was not answered; `data` then is as old as it was. */
  error: Error | null;
}

export interface Watch<T> {
  /** Another answer, as a page read anew brings it; an older one changes nothing. */
  put: (data: T) => void;
  again: () => void;
  stop: () => void;
}

/** Begins to keep a read fresh, from what the page was drawn with. */
export type BeginWatch<T> = (first: T, onChange: (seen: Watched<T>) => void) => Watch<T>;

/** `atOf`: when an answer was made, ms by the server's clock; a phone's own may be an hour off. */
export function watchQuery<T>(
  // biome-ignore lint/suspicious/noExplicitAny: the form of the key does not matter here
  options: QueryObserverOptions<T, Error, T, T, any>,
  atOf: (data: T) => number,
): BeginWatch<T> {
  return (first, onChange) => {
    const client = queryClient();
    const key = options.queryKey;
    const put = (data: T) => {
      const known = client.getQueryData<T>(key);
      if (known && atOf(known) >= atOf(data)) return;
      client.setQueryData<T>(key, () => data, { updatedAt: Math.min(atOf(data), Date.now()) });
    };
    put(first);
    const observer = new QueryObserver(client, options);
    const show = ({ data, error }: { data: T | undefined; error: Error | null }) => {
      if (data !== undefined) onChange({ data, error });
    };
    const stop = observer.subscribe(show);
    const now = observer.getCurrentResult();
    if (now.data !== first) show(now);
    return { put, again: () => void observer.refetch(), stop };
  };
}
