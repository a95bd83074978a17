import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import { pollAfterMs } from './poll';
import type { WalkUpOptions } from './read-walk-up';
import type { Board } from './reads';

export const boardKey = (club: string) => ['board', club];

export function boardQuery(club: string) {
  return queryOptions({
    queryKey: boardKey(club),
    queryFn: ({ signal }) => getJson<Board>(`/api/clubs/${club}/board`, signal),
    // The interval itself tries again, ever more seldom.
    retry: false,
    refetchInterval: ({ state }) =>
      pollAfterMs({ failing: state.status === 'error', lastAnswerAt: state.dataUpdatedAt, now: Date.now() }),
    refetchOnWindowFocus: 'always',
  });
}

export function walkUpQuery(club: string) {
  return queryOptions({
    queryKey: ['walk-up', club],
    queryFn: ({ signal }) => getJson<WalkUpOptions>(`/api/clubs/${club}/board/walk-up`, signal),
    staleTime: 0,
    gcTime: 0,
  });
}
