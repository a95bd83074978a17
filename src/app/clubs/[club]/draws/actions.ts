'use server';

import { cancelSit } from '@/features/bookings/cancel-sit';
import { cancelSitSchema } from '@/features/bookings/sit-schema';
import { drawIdSchema, enterDrawSchema, openDrawSchema, swapSchema } from '@/features/draws/draw-schema';
import { enterDraw, leaveDraw } from '@/features/draws/enter-draw';
import { cancelDraw, openDraw } from '@/features/draws/open-draw';
import { publishDraw } from '@/features/draws/publish-draw';
import { startDraw, stopRun } from '@/features/draws/run-draw';
import { acceptSwap, offerSwap } from '@/features/draws/swap-sits';
import { clubAction } from '@/server/doors';

export const openDrawAction = clubAction({
  permission: 'draws.write',
  input: openDrawSchema,
  run: ({ scope, input, now }) => openDraw(scope, input, now),
});

export const cancelDrawAction = clubAction({
  permission: 'draws.write',
  input: drawIdSchema,
  run: ({ scope, input, now }) => cancelDraw(scope, input.drawId, now),
});

export const runDrawAction = clubAction({
  permission: 'draws.write',
  input: drawIdSchema,
  run: ({ scope, input, now }) => startDraw(scope, input.drawId, now),
});

export const stopDrawAction = clubAction({
  permission: 'draws.write',
  input: drawIdSchema,
  run: ({ scope, input, now }) => stopRun(scope, input.drawId, now),
});

export const publishDrawAction = clubAction({
  permission: 'draws.write',
  input: drawIdSchema,
  run: ({ scope, input, now }) => publishDraw(scope, input.drawId, now),
});

export const enterDrawAction = clubAction({
  permission: 'draws.enter',
  input: enterDrawSchema,
  run: ({ scope, input, now }) => enterDraw(scope, input, now),
});

export const leaveDrawAction = clubAction({
  permission: 'draws.enter',
  input: drawIdSchema,
  run: ({ scope, input, now }) => leaveDraw(scope, input.drawId, now),
});

export const offerSwapAction = clubAction({
  permission: 'draws.enter',
  input: swapSchema,
  run: ({ scope, input, now }) => offerSwap(scope, input, now),
});

export const acceptSwapAction = clubAction({
  permission: 'draws.enter',
  input: swapSchema,
  run: ({ scope, input, now }) => acceptSwap(scope, input, now),
});

export const giveBackAction = clubAction({
  permission: 'draws.enter',
  input: cancelSitSchema,
  run: async ({ scope, input, now }) => ({ id: (await cancelSit(scope, input, now)).id }),
});
