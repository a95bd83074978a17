import { z } from 'zod';
import { readMap } from '@/features/map/read-map';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('features.read', {
  query: z.object({}),
  run: ({ scope, now }) => readMap(scope, now),
});
