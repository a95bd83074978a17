import {
  type DefinedInitialDataOptions,
  type DefinedUseQueryResult,
  QueryClient,
  type QueryKey,
  type UseQueryOptions,
  type UseQueryResult,
  useQuery,
} from '@tanstack/react-query';

/** Server pages fill the cache first; poor signal makes needless refetching costly. */
const DEFAULTS = { queries: { staleTime: 30_000, retry: 1, refetchOnWindowFocus: false } };

let own: QueryClient | undefined;

/**
 * The browser's one cache of reads. Handed over by name and not by a provider at the root, so that its script comes only
 * with the parts that ask. A server keeps nothing from one request to the next.
 */
export function queryClient(): QueryClient {
  if (typeof window === 'undefined') return new QueryClient({ defaultOptions: DEFAULTS });
  if (!own) {
    own = new QueryClient({ defaultOptions: DEFAULTS });
    own.mount();
  }
  return own;
}

/** `useQuery` on the one cache: how every part reads. */
export function useRead<Fetched, Data = Fetched, Key extends QueryKey = QueryKey>(
  options: DefinedInitialDataOptions<Fetched, Error, Data, Key>,
): DefinedUseQueryResult<Data, Error>;
export function useRead<Fetched, Data = Fetched, Key extends QueryKey = QueryKey>(
  options: UseQueryOptions<Fetched, Error, Data, Key>,
): UseQueryResult<Data, Error>;
export function useRead<Fetched, Data, Key extends QueryKey>(options: UseQueryOptions<Fetched, Error, Data, Key>) {
  return useQuery(options, queryClient());
}
