import { sitsAskSchema } from '@/features/sits/ask-schema';
import { readSitDetail } from '@/features/sits/reads';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('sits.read', {
  query: sitsAskSchema,
  run: ({ scope, params, query, now }) => readSitDetail(scope, params.stand ?? '', query, now),
});
