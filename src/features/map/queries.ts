import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import type { MapView } from './thing';

export function mapQuery(club: string) {
  return queryOptions({
    queryKey: ['map', club],
    queryFn: ({ signal }) => getJson<MapView>(`/api/clubs/${club}/map`, signal),
    staleTime: 60_000,
  });
}
