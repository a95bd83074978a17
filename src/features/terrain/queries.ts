import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import type { ContoursView } from './read-contours';
import type { SlopeView } from './read-slope';

/** Hills do not move: what was read once holds while the page is open. */
export function contoursQuery(club: string) {
  return queryOptions({
    queryKey: ['contours', club],
    queryFn: ({ signal }) => getJson<ContoursView>(`/api/clubs/${club}/terrain/contours`, signal),
    staleTime: Number.POSITIVE_INFINITY,
    retry: false,
  });
}

export function slopeQuery(club: string, at: { lat: number; lon: number }) {
  return queryOptions({
    queryKey: ['slope', club, at],
    queryFn: ({ signal }) => getJson<SlopeView>(`/api/clubs/${club}/terrain/slope?lat=${at.lat}&lon=${at.lon}`, signal),
    staleTime: Number.POSITIVE_INFINITY,
    retry: false,
  });
}
