import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import type { Board } from './reads';

const POLL_MS = 60_000;

export function boardQuery(club: string) {
  return queryOptions({
    queryKey: ['board', club],
    queryFn: ({ signal }) => getJson<Board>(`/api/clubs/${club}/board`, signal),
    refetchInterval: POLL_MS,
    refetchOnWindowFocus: true,
  });
}
