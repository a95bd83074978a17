import { sitsAskSchema } from '@/features/sits/ask-schema';
import { readKeptSits } from '@/features/sits/kept-reads';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('sits.read', {
  query: sitsAskSchema,
  run: ({ scope, query, now }) => readKeptSits(scope, query, now),
});
