import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@/lib/get-json';
import type { RunView } from './read-run';

const AT_WORK_MS = 1_000;

/** The work on a draw, asked for every second while there is any; each run is a question of its own. */
export function runQuery(club: string, drawId: string, runId: string | undefined) {
  return queryOptions({
    queryKey: ['draw-run', club, drawId, runId],
    queryFn: ({ signal }) => getJson<RunView | null>(`/api/clubs/${club}/draws/${drawId}/run`, signal),
    refetchInterval: ({ state }) => (state.data?.atWork ? AT_WORK_MS : false),
  });
}
