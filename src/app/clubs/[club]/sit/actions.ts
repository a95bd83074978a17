'use server';

import { bookSit } from '@/features/bookings/book-sit';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { changeSit } from '@/features/bookings/change-sit';
import { bookSitSchema, cancelSitSchema, changeSitSchema } from '@/features/bookings/sit-schema';
import { savedSit } from '@/features/bookings/sit-view';
import { clubAction } from '@/server/doors';

export const bookSitAction = clubAction({
  permission: 'sits.book',
  input: bookSitSchema,
  run: async ({ scope, input, now }) => savedSit(scope, await bookSit(scope, input, now)),
});

export const changeSitAction = clubAction({
  permission: 'sits.book',
  input: changeSitSchema,
  run: async ({ scope, input, now }) => savedSit(scope, await changeSit(scope, input, now)),
});

export const cancelSitAction = clubAction({
  permission: 'sits.book',
  input: cancelSitSchema,
  run: async ({ scope, input, now }) => savedSit(scope, await cancelSit(scope, input, now)),
});
