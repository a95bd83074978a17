import { z } from 'zod';
import { readSlope } from '@/features/terrain/read-slope';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('stands.write', {
  query: z.object({ lat: z.coerce.number().min(-89).max(89), lon: z.coerce.number().min(-180).max(180) }),
  run: ({ query, now }) => readSlope(query, now),
});
