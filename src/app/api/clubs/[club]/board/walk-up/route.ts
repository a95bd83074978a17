import { z } from 'zod';
import { readWalkUp } from '@/features/board/read-walk-up';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('sits.book', {
  query: z.object({}),
  run: ({ scope, now }) => readWalkUp(scope, now),
});
