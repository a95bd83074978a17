'use server';

import { savedSit } from '@/features/bookings/sit-view';
import { swapSitSchema } from '@/features/notices/swap-schema';
import { swapSit } from '@/features/notices/swap-sit';
import { clubAction } from '@/server/doors';

export const swapSitAction = clubAction({
  permission: 'sits.book',
  input: swapSitSchema,
  run: async ({ scope, input, now }) => savedSit(scope, await swapSit(scope, input, now)),
});
