import { weekAskSchema } from '@/features/sits/ask-schema';
import { readKeptWeek } from '@/features/sits/kept-reads';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('sits.read', {
  query: weekAskSchema,
  run: ({ scope, query, now }) => readKeptWeek(scope, query, now),
});
