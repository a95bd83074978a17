import { z } from 'zod';
import { env } from '@/env';
import { readBareRows } from '@/features/sits/read-bare-rows';
import { publicRoute } from '@/server/doors';
import { notFound } from '@/server/errors';
import { systemScopeBySlug } from '@/server/scope';

/** For the bench alone: the rows of the sits read with nothing made of them, to measure the read against. */
export const GET = publicRoute({
  query: z.object({}),
  run: async ({ params, now }) => {
    if (!env.devPages) throw notFound();
    return readBareRows(await systemScopeBySlug(params.club ?? ''), now);
  },
});
