import { addDays, dayOf, daysBetween, formatClock, formatDay } from '@/core/day-time';
import { can } from '@/core/permissions';
import { dueState, itemsFor, strapDue } from '@/core/upkeep/inspection';
import { type ReadFrom, reader, type Tx, write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { env } from '@/env';
import { listStands } from '@/features/ground/stands-data';
import { composeMail } from '@/features/mail/compose';
import { hasMail } from '@/features/mail/data';
import { queueMail } from '@/server/outbox';
import { type ClubScope, systemScopeById } from '@/server/scope';
import { listOpenChores, listPeople } from './chores-data';
import { lastInspections } from './inspections-data';
import { strapReason } from './upkeep-reads';
import { UPKEEP_MAIL } from './words/chores';

/** Hours of the club's clock in which a reminder may arrive. */
const FROM_CLOCK = '08:00';
const TO_CLOCK = '20:30';
/** A chore is spoken of so many days before its day. Our choice. */
const CHORE_DAYS = 3;

interface Person {
  name: string;
  email: string;
}

interface Reminder {
  /** One mail for one key, for ever. */
  key: string;
  kind: 'upkeep.due' | 'chore.due';
  to: Person;
  subject: string;
  lines: string[];
  opening: string;
}

/** Straps and looks that come due or are over. */
async function dueAtStands(scope: ClubScope, today: string, from: ReadFrom): Promise<string[]> {
  const words = UPKEEP_MAIL.stands;
  const last = await lastInspections(scope, from);
  return (await listStands(scope, from)).flatMap((stand) => {
    const row = last.get(stand.id);
    if (!row) return [];
    const lines: string[] = [];
    const due = strapDue({ fittedOn: row.strapFittedOn, makerYears: row.strapYears });
    if (due && itemsFor(stand.kind).includes('straps') && dueState(due.lastDay, today) !== 'fine') {
      const say = dueState(due.lastDay, today) === 'over' ? words.strapOver : words.strapSoon;
      lines.push(say(stand.name, formatDay(due.lastDay, true), strapReason(due)));
    }
    if (dueState(row.nextDueOn, today) !== 'fine') {
      lines.push(words.look(stand.name, formatDay(row.nextDueOn, true)));
    }
    return lines;
  });
}

/** One mail a steward and week, for as long as something is due. */
async function ofStands(scope: ClubScope, today: string, from: ReadFrom): Promise<Reminder[]> {
  const lines = await dueAtStands(scope, today, from);
  if (lines.length === 0) return [];
  const week = Math.floor(daysBetween('1970-01-05', today) / 7);
  const stewards = (await listPeople(scope, from)).filter(({ role }) => can(role, 'inspections.write'));
  return stewards.map(({ id, name, email }) => ({
    key: `upkeep.due:${id}:${week}`,
    kind: 'upkeep.due',
    to: { name, email },
    subject: UPKEEP_MAIL.stands.subject(lines.length),
    opening: UPKEEP_MAIL.stands.opening,
    lines,
  }));
}

async function ofChores(scope: ClubScope, today: string, from: ReadFrom): Promise<Reminder[]> {
  const words = UPKEEP_MAIL.chore;
  return (await listOpenChores(scope, from)).flatMap((chore): Reminder[] => {
    const { id, title, dueOn, assigneeId, assigneeName, assigneeEmail, placeName } = chore;
    if (dueOn === null || assigneeName === null || assigneeEmail === null) return [];
    if (dueOn > addDays(today, CHORE_DAYS)) return [];
    return [
      {
        key: `chore.due:${id}:${assigneeId}:${dueOn}`,
        kind: 'chore.due',
        to: { name: assigneeName, email: assigneeEmail },
        subject: words.subject(formatDay(dueOn), title),
        opening: words.opening(formatDay(dueOn, true)),
        lines: [words.line(title, placeName)],
      },
    ];
  });
}

async function listReminders(scope: ClubScope, now: number, from: ReadFrom): Promise<Reminder[]> {
  const today = dayOf(now, scope.club.zone);
  const all = [...(await ofStands(scope, today, from)), ...(await ofChores(scope, today, from))];
  const told = await hasMail(
    all.map(({ key }) => key),
    from,
  );
  return all.filter(({ key }) => !told.has(key));
}

async function send(tx: Tx, scope: ClubScope, mail: Reminder, now: number): Promise<boolean> {
  const { club } = scope;
  const { text, html } = composeMail({
    clubName: club.name,
    paragraphs: [UPKEEP_MAIL.hello(mail.to.name), mail.opening, mail.lines.join('\n')],
    button: { label: UPKEEP_MAIL.button, url: `${env.appUrl}/clubs/${club.slug}/chores` },
    footer: mail.kind === 'chore.due' ? UPKEEP_MAIL.chore.footer : UPKEEP_MAIL.stands.footer,
  });
  const { key: dedupeKey, kind, to, subject } = mail;
  return queueMail(tx, { clubId: club.id, kind, dedupeKey, to, subject, text, html }, now);
}

/** Tells stewards of straps and looks that come due, and members once of each chore: by day, in any number of processes. */
export async function remindUpkeep(now: number): Promise<{ reminded: number }> {
  let reminded = 0;
  for (const club of await listClubs()) {
    const clock = formatClock(now, club.zone);
    if (clock < FROM_CLOCK || clock > TO_CLOCK) continue;
    const scope = await systemScopeById(club.id);
    if ((await listReminders(scope, now, reader())).length === 0) continue;
    reminded += await write(async (tx) => {
      let count = 0;
      for (const mail of await listReminders(scope, now, tx)) {
        if (await send(tx, scope, mail, now)) count += 1;
      }
      return count;
    });
  }
  return { reminded };
}
