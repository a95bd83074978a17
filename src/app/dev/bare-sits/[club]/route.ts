import { z } from 'zod';
import { env } from '@/env';
import { readBareRows } from '@/features/sits/read-bare-rows';
import { clubRoute } from '@/server/doors';
import { notFound } from '@/server/errors';

/** For the bench alone: the rows of the sits read with nothing made of them, to measure the read against. */
export const GET = clubRoute('features.read', {
  query: z.object({}),
  run: ({ scope, now }) => {
    if (!env.devPages) throw notFound();
    return readBareRows(scope, now);
  },
});
