import { weekAskSchema } from '@/features/sits/ask-schema';
import { readWeek } from '@/features/sits/read-week';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('sits.read', {
  query: weekAskSchema,
  run: ({ scope, query, now }) => readWeek(scope, query, now),
});
