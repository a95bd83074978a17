import { addDays, dayOf, formatClock, formatDay } from '@/core/day-time';
import { can } from '@/core/permissions';
import { type ReadFrom, reader, write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { env } from '@/env';
import { listClosuresFrom } from '@/features/ground/closures-data';
import { listStands, type StandRow } from '@/features/ground/stands-data';
import { type ClubScope, systemScopeById } from '@/server/scope';
import { listNoticePeople } from './choices-data';
import { lastSitDays } from './outlooks-data';
import { queueNotice, wanting } from './queue-notice';
import { RESTED_MAIL } from './words/mails';

/** Hours of the club's clock in which it may be told. */
const FROM_CLOCK = '07:00';
const TO_CLOCK = '12:00';

/** Stands whose rest ended last night, and which are open today. */
export async function restedToday(scope: ClubScope, today: string, from: ReadFrom): Promise<StandRow[]> {
  const last = await lastSitDays(scope, today, from);
  const closed = (await listClosuresFrom(scope, today, from)).filter(({ fromDay }) => fromDay <= today);
  return (await listStands(scope, from)).filter((stand) => {
    const day = last.get(stand.id);
    const rest = stand.restDays ?? scope.club.rules.restDaysDefault;
    if (day === undefined || rest === 0 || addDays(day, rest + 1) !== today) return false;
    return !closed.some(({ standId }) => standId === null || standId === stand.id);
  });
}

/** Tells those who asked for it which stands have had their rest: one mail a morning. */
export async function tellRested(now: number): Promise<{ told: number }> {
  let told = 0;
  for (const club of await listClubs()) {
    const clock = formatClock(now, club.zone);
    if (clock < FROM_CLOCK || clock >= TO_CLOCK) continue;
    const scope = await systemScopeById(club.id);
    const today = dayOf(now, club.zone);
    if ((await restedToday(scope, today, reader())).length === 0) continue;
    told += await write(async (tx) => {
      const stands = await restedToday(scope, today, tx);
      let count = 0;
      for (const person of wanting(await listNoticePeople(scope, tx), 'rest_over', today)) {
        const open = stands.filter(({ allowedMemberIds: ids }) => ids === null || ids.includes(person.memberId));
        if (open.length === 0 || !can(person.role, 'stands.read')) continue;
        const names = open.map(({ name }) => name);
        const mail = {
          kind: 'rest_over' as const,
          dedupeKey: `notice.rest_over:${person.memberId}:${today}`,
          subject: RESTED_MAIL.subject(names),
          paragraphs: [RESTED_MAIL.opening(names, formatDay(today))],
          button: { label: RESTED_MAIL.button, url: `${env.appUrl}/clubs/${club.slug}/sit` },
        };
        if (await queueNotice(tx, scope, person, mail, now)) count += 1;
      }
      return count;
    });
  }
  return { told };
}
