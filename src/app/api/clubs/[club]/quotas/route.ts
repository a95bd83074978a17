import { readQuotasOf } from '@/features/harvest/quota-cautions';
import { quotaQuery } from '@/features/harvest/quota-schema';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('sits.book', {
  query: quotaQuery,
  run: ({ scope, query }) => readQuotasOf(scope, { day: query.day, memberId: query.member }),
});
