import { addDays, dayOf, daysBetween, formatClock, formatDay } from '@/core/day-time';
import { can } from '@/core/permissions';
import { type ReadFrom, reader, write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { env } from '@/env';
import { listBookedSits } from '@/features/bookings/data';
import { dayAndWindow, spanText } from '@/features/bookings/words/sits';
import { listOpenChores } from '@/features/chores/chores-data';
import { listWorkDays } from '@/features/chores/work-days-data';
import { listClosuresFrom } from '@/features/ground/closures-data';
import { listStands } from '@/features/ground/stands-data';
import { type ClubScope, systemScopeById } from '@/server/scope';
import { listNoticePeople, type NoticePerson } from './choices-data';
import { queueNotice, wanting } from './queue-notice';
import { WEEKLY_MAIL } from './words/mails';

/** Before the busiest days: Thursday from six in the evening, by the club's clock. Our choice. */
const WEEKDAY = 4;
const FROM_CLOCK = '18:00';
const TO_CLOCK = '22:00';
const DAYS_AHEAD = 7;

/** 0 is Sunday; 4 January 1970 was one. */
export function weekdayOf(day: string): number {
  return ((daysBetween('1970-01-04', day) % 7) + 7) % 7;
}

async function loadWeek(scope: ClubScope, today: string, from: ReadFrom) {
  const toDay = addDays(today, DAYS_AHEAD);
  const closures = await listClosuresFrom(scope, today, from);
  return {
    sits: await listBookedSits(scope, { fromDay: today, toDay }, from),
    closures: closures.filter(({ fromDay }) => fromDay <= toDay),
    stands: new Map((await listStands(scope, from)).map(({ id, name }) => [id, name])),
    chores: await listOpenChores(scope, from),
    workDays: (await listWorkDays(scope, today, from)).filter(({ day }) => day <= addDays(today, 3 * DAYS_AHEAD)),
  };
}

type Week = Awaited<ReturnType<typeof loadWeek>>;

const words = WEEKLY_MAIL;
const { block } = words;

function paragraphsFor(scope: ClubScope, person: NoticePerson, week: Week): string[] {
  const { club } = scope;
  const mine = week.sits.filter(({ memberId }) => memberId === person.memberId);
  const closed = week.closures.map(({ standId, fromDay, toDay, reason }) => {
    const what = standId === null ? words.wholeGround : (week.stands.get(standId) ?? words.goneStand);
    return words.closure({ what, from: formatDay(fromDay), to: toDay && formatDay(toDay), reason });
  });
  const doesChores = can(person.role, 'chores.read');
  const chores = week.chores.filter(({ assigneeId }) => assigneeId === person.memberId);
  const free = week.chores.filter(({ assigneeId }) => assigneeId === null).length;
  return [
    ...(can(person.role, 'sits.book')
      ? [
          block(
            words.sits,
            mine.map((sit) =>
              words.sit(sit.standName, dayAndWindow(sit.day, sit.windows), spanText(sit.startAt, sit.endAt, club)),
            ),
            words.noSits,
          ),
        ]
      : []),
    words.clubSits(week.sits.length),
    block(words.closed, closed, words.noClosed),
    ...(doesChores
      ? [
          block(
            words.chores,
            chores.map(({ title, dueOn }) => words.chore(title, dueOn && formatDay(dueOn))),
            words.noChores(free),
          ),
          block(
            words.workDays,
            week.workDays.map((row) =>
              words.workDay(row.title, formatDay(row.day), spanText(row.startAt, row.endAt, club)),
            ),
            words.noWorkDays,
          ),
        ]
      : []),
  ];
}

/** The week ahead in one letter, to those who asked for it: once a week. */
export async function sendWeekly(now: number): Promise<{ sent: number }> {
  let sent = 0;
  for (const club of await listClubs()) {
    const clock = formatClock(now, club.zone);
    const today = dayOf(now, club.zone);
    if (weekdayOf(today) !== WEEKDAY || clock < FROM_CLOCK || clock >= TO_CLOCK) continue;
    const scope = await systemScopeById(club.id);
    const people = wanting(await listNoticePeople(scope, reader()), 'weekly', today);
    if (people.length === 0) continue;
    sent += await write(async (tx) => {
      const week = await loadWeek(scope, today, tx);
      let count = 0;
      for (const person of people) {
        const mail = {
          kind: 'weekly' as const,
          dedupeKey: `notice.weekly:${person.memberId}:${today}`,
          subject: words.subject(club.name),
          paragraphs: paragraphsFor(scope, person, week),
          button: { label: words.button, url: `${env.appUrl}/clubs/${club.slug}` },
        };
        if (await queueNotice(tx, scope, person, mail, now)) count += 1;
      }
      return count;
    });
  }
  return { sent };
}
