import { write } from '@/db/client';
import { placeSitIn } from '@/features/bookings/book-sit';
import { getStand } from '@/features/ground/stands-data';
import { newRequestKey } from '@/lib/request-key';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { updateDraw } from './draws-data';
import { drawName, needDraw, noteDraw } from './note-draw';
import { listResults, updateResult } from './results-data';
import { liveRun } from './runs';
import { slotName } from './slots';
import { DRAW_AUDIT, DRAW_ERRORS } from './words/errors';

/** Books everything the draw gave, or nothing: one refusal and all of it is as before. */
export async function publishDraw(scope: ClubScope, drawId: string, now: number): Promise<{ booked: number }> {
  return write(async (tx) => {
    const draw = await needDraw(scope, drawId, ['drawn'], tx);
    if (await liveRun(scope, drawId, now, tx)) throw new AppError('conflict', DRAW_ERRORS.atWork);
    let booked = 0;
    for (const { result, entry, name } of await listResults(scope, drawId, tx)) {
      const { memberId, standId } = result;
      const slot = draw.slots[result.slot];
      if (standId === null || !slot) continue;
      const what = { memberId, standId, weapon: entry.weapon, guests: entry.guests, ...slot };
      const blank = { approachId: null, note: '', requestKey: newRequestKey() };
      try {
        const sit = await placeSitIn(tx, scope, { ...what, ...blank }, now);
        await updateResult(scope, tx, result, { sitId: sit.id });
        booked++;
      } catch (error) {
        if (!(error instanceof AppError)) throw error;
        const stand = (await getStand(scope, standId, tx))?.name ?? DRAW_ERRORS.aStand;
        throw new AppError('conflict', DRAW_ERRORS.cannotHave(name, stand, slotName(slot), error.message));
      }
    }
    if (booked === 0) throw new AppError('conflict', DRAW_ERRORS.nothingGiven);
    await updateDraw(scope, tx, drawId, { state: 'published', publishedAt: now });
    const summary = DRAW_AUDIT.published(drawName(draw), booked);
    await noteDraw(scope, tx, { id: drawId, verb: 'published', summary }, now);
    return { booked };
  });
}
