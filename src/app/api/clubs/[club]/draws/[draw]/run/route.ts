import { z } from 'zod';
import { readRun } from '@/features/draws/read-run';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('draws.write', {
  query: z.object({}),
  run: ({ scope, params, now }) => readRun(scope, params.draw ?? '', now),
});
