import { trialSeatSchema } from '@/features/coverage/coverage-schema';
import { lookAtSeat } from '@/features/coverage/look-at-seat';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('features.read', {
  query: trialSeatSchema,
  run: ({ scope, query, now }) => lookAtSeat(scope, query, now),
});
