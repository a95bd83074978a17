import { queryOptions } from '@tanstack/react-query';
import type { BookedSit } from './people-data';

/** Booked sits that a closure would fall on. */
export function touchedSitsQuery(club: string, closure: { standId: string; fromDay: string; toDay: string }) {
  return queryOptions({
    queryKey: ['touched-sits', club, closure],
    queryFn: async (): Promise<BookedSit[]> => {
      const query = new URLSearchParams(Object.entries(closure).filter(([, value]) => value !== ''));
      const answer = await fetch(`/api/clubs/${club}/closures/touched?${query}`);
      if (!answer.ok) throw new Error('The booked sits could not be read.');
      return answer.json();
    },
    staleTime: 0,
  });
}
