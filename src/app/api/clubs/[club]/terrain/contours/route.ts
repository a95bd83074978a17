import { z } from 'zod';
import { readPlaces } from '@/features/map/read-places';
import { readContours } from '@/features/terrain/read-contours';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('features.read', {
  query: z.object({}),
  run: async ({ scope, now }) => readContours(scope, await readPlaces(scope), now),
});
