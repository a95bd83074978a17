import { write } from '@/db/client';
import { placeSitIn } from '@/features/bookings/book-sit';
import { getStand } from '@/features/ground/stands-data';
import { newRequestKey } from '@/lib/request-key';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { listEntries, updateDraw, updateEntry } from './draws-data';
import { drawName, needDraw, noteDraw } from './note-draw';

/** Books everything the draw gave, or nothing: one refusal and all of it is as before. */
export async function publishDraw(scope: ClubScope, drawId: string, now: number): Promise<{ booked: number }> {
  return write(async (tx) => {
    const draw = await needDraw(scope, drawId, ['drawn'], tx);
    let booked = 0;
    for (const { entry, name } of await listEntries(scope, drawId, tx)) {
      const { memberId, standId, weapon } = entry;
      if (standId === null) continue;
      const what = { memberId, standId, weapon, day: draw.day, windows: draw.windows };
      const blank = { approachId: null, guests: [], note: '', requestKey: newRequestKey() };
      try {
        const sit = await placeSitIn(tx, scope, { ...what, ...blank }, now);
        await updateEntry(scope, tx, entry, { sitId: sit.id });
        booked++;
      } catch (error) {
        if (!(error instanceof AppError)) throw error;
        const stand = await getStand(scope, standId, tx);
        const text = `Nothing was booked: ${name} cannot have ${stand?.name ?? 'the stand'} any more. ${error.message} Make the draw again.`;
        throw new AppError('conflict', text);
      }
    }
    await updateDraw(scope, tx, drawId, { state: 'published', publishedAt: now });
    const summary = `Published ${drawName(draw)}: ${booked} ${booked === 1 ? 'sit' : 'sits'} booked.`;
    await noteDraw(scope, tx, { id: drawId, verb: 'published', summary }, now);
    return { booked };
  });
}
