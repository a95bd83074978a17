import { sitsAskSchema } from '@/features/sits/ask-schema';
import { readSits } from '@/features/sits/reads';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('sits.read', {
  query: sitsAskSchema,
  run: ({ scope, query, now }) => readSits(scope, query, now),
});
