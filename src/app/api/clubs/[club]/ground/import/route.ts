import { uploadQuery } from '@/features/exchange/exchange-schema';
import { takeUpload } from '@/features/exchange/take-upload';
import { clubRoute } from '@/server/doors';

/** Takes the file itself as the body. */
export const POST = clubRoute('features.write', {
  query: uploadQuery,
  run: ({ scope, query, request, now }) => takeUpload(scope, { name: query.name, request }, now),
});
