import { touchedQuery } from '@/features/ground/action-inputs';
import { sitsTouchedByClosure } from '@/features/ground/reads';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('closed_days.write', {
  query: touchedQuery,
  run: ({ scope, query, now }) =>
    sitsTouchedByClosure(
      scope,
      { standId: query.standId ?? null, fromDay: query.fromDay, toDay: query.toDay ?? null },
      now,
    ),
});
