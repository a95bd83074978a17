import { momentQuery } from '@/features/moment/ask-moment';
import { readMoment } from '@/features/moment/read-moment';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('features.read', {
  query: momentQuery,
  run: ({ scope, query, now }) => readMoment(scope, query, now),
});
