import { formatClock } from '@/core/day-time';
import { type ReadFrom, reader, type Tx, write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { env } from '@/env';
import { dayAndWindow, spanText } from '@/features/bookings/words/sits';
import { composeMail } from '@/features/mail/compose';
import { hasMail } from '@/features/mail/data';
import { queueMail } from '@/server/outbox';
import { type ClubScope, systemScopeById } from '@/server/scope';
import { findPerson, type LoggableSit, listUnlogged } from './logs-data';
import { LOG_REMINDER_MAIL } from './words/screen';

const HOUR_MS = 3_600_000;
/** Most write their log on the way home; the others are asked once after a night's sleep (our choice). */
const AFTER_MS = 14 * HOUR_MS;
/** A sit this old is past asking: the club was away, or the count is forgotten. */
const UNTIL_MS = 7 * 24 * HOUR_MS;
/** Hours of the club's clock in which a reminder may arrive. */
const FROM_CLOCK = '08:00';
const TO_CLOCK = '20:30';

const keyOf = (sit: LoggableSit) => `log.missing:${sit.id}`;

/** The member, or for a guest's sit the member who answers for them: guests write no logs. */
async function reminded(tx: Tx, scope: ClubScope, sit: LoggableSit): Promise<{ name: string; email: string } | null> {
  if (sit.memberRole !== 'guest') return { name: sit.memberName, email: sit.memberEmail };
  const sponsor = sit.sponsorId === null ? null : await findPerson(scope, sit.sponsorId, tx);
  return sponsor && sponsor.removedAt === null ? { name: sponsor.name, email: sponsor.email } : null;
}

async function remind(tx: Tx, scope: ClubScope, sit: LoggableSit, now: number): Promise<boolean> {
  const { club } = scope;
  const to = await reminded(tx, scope, sit);
  if (!to) return false;
  const words = LOG_REMINDER_MAIL;
  const guest = to.name === sit.memberName ? null : sit.memberName;
  const when = dayAndWindow(sit.day, sit.windows, true);
  const { text, html } = composeMail({
    clubName: club.name,
    paragraphs: [words.hello(to.name), words.opening(sit.standName, guest)],
    facts: [
      { label: words.stand, value: sit.standName },
      { label: words.when, value: when },
      { label: words.clubTime, value: spanText(sit.startAt, sit.endAt, club) },
    ],
    button: { label: words.button, url: `${env.appUrl}/clubs/${club.slug}/log/${sit.id}` },
    footer: words.footer,
  });
  const subject = words.subject(sit.standName, dayAndWindow(sit.day, sit.windows));
  return queueMail(tx, { clubId: club.id, kind: 'log.missing', dedupeKey: keyOf(sit), to, subject, text, html }, now);
}

async function listUnreminded(scope: ClubScope, now: number, from: ReadFrom): Promise<LoggableSit[]> {
  const unlogged = await listUnlogged(scope, { from: now - UNTIL_MS, until: now - AFTER_MS }, from);
  const known = await hasMail(unlogged.map(keyOf), from);
  return unlogged.filter((sit) => !known.has(keyOf(sit)));
}

/** Asks once, by mail and by day, for each log that is missing. The mail's key keeps it to once in any number of processes. */
export async function remindLogs(now: number): Promise<{ reminded: number }> {
  let reminded = 0;
  for (const club of await listClubs()) {
    const clock = formatClock(now, club.zone);
    if (clock < FROM_CLOCK || clock > TO_CLOCK) continue;
    const scope = await systemScopeById(club.id);
    if ((await listUnreminded(scope, now, reader())).length === 0) continue;
    reminded += await write(async (tx) => {
      let count = 0;
      for (const sit of await listUnreminded(scope, now, tx)) if (await remind(tx, scope, sit, now)) count++;
      return count;
    });
  }
  return { reminded };
}
