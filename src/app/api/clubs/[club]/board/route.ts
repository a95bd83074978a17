import { z } from 'zod';
import { readBoard } from '@/features/board/reads';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('board.read', {
  query: z.object({}),
  run: ({ scope, now }) => readBoard(scope, now),
});
