import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import type { SitsAskText, WeekAskText } from './ask-schema';
import type { SitDetailView, SitsView, WeekView } from './view-types';

function address(club: string, path: string, ask: Record<string, string | undefined>): string {
  const query = new URLSearchParams();
  for (const [key, value] of Object.entries(ask)) if (value) query.set(key, value);
  return `/api/clubs/${club}/${path}?${query}`;
}

/** Everything of a club's lists; invalidated after a booking. */
export const sitsKey = (club: string) => ['sits', club] as const;

export function sitsQuery(club: string, ask: SitsAskText) {
  return queryOptions({
    queryKey: [...sitsKey(club), 'list', ask],
    queryFn: ({ signal }) => getJson<SitsView>(address(club, 'sits', ask), signal),
    refetchOnWindowFocus: true,
  });
}

export function sitDetailQuery(club: string, standId: string, ask: SitsAskText) {
  return queryOptions({
    queryKey: [...sitsKey(club), 'detail', standId, ask],
    queryFn: ({ signal }) => getJson<SitDetailView>(address(club, `sits/${standId}`, ask), signal),
  });
}

export function weekQuery(club: string, ask: WeekAskText) {
  return queryOptions({
    queryKey: [...sitsKey(club), 'week', ask],
    queryFn: ({ signal }) => getJson<WeekView>(address(club, 'week', ask), signal),
    refetchOnWindowFocus: true,
    placeholderData: keepPreviousData,
  });
}
