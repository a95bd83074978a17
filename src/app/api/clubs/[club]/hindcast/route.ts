import { z } from 'zod';
import { readHindcast } from '@/features/sits/read-hindcast';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('stands.read', {
  query: z.object({}),
  run: ({ scope, now }) => readHindcast(scope, now),
});
