import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import type { SitsAskText } from './ask-schema';
import { detailAddress } from './read-addresses';
import type { SitDetailView } from './view-types';

/** Everything of a club's lists; invalidated after a booking. */
export const sitsKey = (club: string) => ['sits', club] as const;

export function sitDetailQuery(club: string, standId: string, ask: SitsAskText) {
  const address = detailAddress(club, standId, ask);
  return queryOptions({
    queryKey: [...sitsKey(club), address],
    queryFn: ({ signal }) => getJson<SitDetailView>(address, signal),
    // Asked without a signal too: the service worker may have kept an answer.
    networkMode: 'always',
  });
}
