import { dayOf } from '@/core/day-time';
import { can } from '@/core/permissions';
import { type ReadFrom, reader, write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { findDraw } from '@/features/draws/draws-data';
import { hasMail } from '@/features/mail/data';
import { type ClubScope, systemScopeById } from '@/server/scope';
import { listNoticePeople } from './choices-data';
import { type DrawEvent, listDrawEvents } from './draw-events-data';
import { type DrawMail, drawMailsOf } from './draw-mails';
import { queueNotice, wanting } from './queue-notice';

/** What is older is known by now, or was done before the member chose to be told. */
const SINCE_MS = 48 * 3_600_000;

async function mailsLeft(scope: ClubScope, event: DrawEvent, from: ReadFrom, now: number): Promise<DrawMail[]> {
  const draw = await findDraw(scope, event.subjectId, from);
  if (!draw) return [];
  const today = dayOf(now, scope.club.zone);
  const people = wanting(await listNoticePeople(scope, from), 'draw_changed', today).filter(({ role }) =>
    can(role, 'draws.enter'),
  );
  const mails = await drawMailsOf(scope, { event, draw, people }, from, now);
  const known = await hasMail(
    mails.map(({ mail }) => mail.dedupeKey),
    from,
  );
  return mails.filter(({ mail }) => !known.has(mail.dedupeKey));
}

/** Tells of a draw that opened, was published or called off, and of a swap offered: once for each event and member. */
export async function tellDraws(now: number): Promise<{ told: number }> {
  let told = 0;
  for (const club of await listClubs()) {
    const scope = await systemScopeById(club.id);
    for (const event of await listDrawEvents(scope, now - SINCE_MS)) {
      if ((await mailsLeft(scope, event, reader(), now)).length === 0) continue;
      told += await write(async (tx) => {
        let count = 0;
        for (const { person, mail } of await mailsLeft(scope, event, tx, now)) {
          if (await queueNotice(tx, scope, person, mail, now)) count += 1;
        }
        return count;
      });
    }
  }
  return { told };
}
