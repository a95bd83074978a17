import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import type { TrialSeatAsk } from './coverage-schema';

/** A trial's seat as the core sees it; what was said before stays until the next has come. */
export function seatQuery(club: string, ask: TrialSeatAsk) {
  return queryOptions({
    queryKey: ['trial-seat', club, ask],
    queryFn: ({ signal }) => {
      const query = new URLSearchParams({ ...ask, lat: ask.lat.toFixed(5), lon: ask.lon.toFixed(5) });
      return getJson<{ text: string | null }>(`/api/clubs/${club}/coverage/seat?${query}`, signal);
    },
    staleTime: 60_000,
    placeholderData: keepPreviousData,
  });
}
