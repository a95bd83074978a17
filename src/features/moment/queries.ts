import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import type { MomentAsk } from './ask-moment';
import type { MomentView } from './moment-types';

/** One half hour; the one before stays on the screen until the next has come. */
export function momentAsked(club: string, ask: MomentAsk) {
  return queryOptions({
    queryKey: ['moment', club, ask],
    queryFn: ({ signal }) => {
      const { step, ...rest } = ask;
      const query = new URLSearchParams({ ...rest, step: String(step) });
      return getJson<MomentView>(`/api/clubs/${club}/map/moment?${query}`, signal);
    },
    staleTime: 60_000,
    placeholderData: keepPreviousData,
  });
}
