import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import type { QuotaCaution } from './quota-cautions';

/** What is said of quotas before somebody is booked. */
export function quotasQuery(club: string, ask: { day: string; member: string }) {
  return queryOptions({
    queryKey: ['quotas', club, ask],
    queryFn: ({ signal }) => getJson<QuotaCaution[]>(`/api/clubs/${club}/quotas?${new URLSearchParams(ask)}`, signal),
  });
}
