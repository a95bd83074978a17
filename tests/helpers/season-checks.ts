import { and, eq, gte } from 'drizzle-orm';
import { addDays, dayOf, daysBetween } from '@/core/day-time';
import { lapsesAt } from '@/core/outing/board-state';
import { dueSteps } from '@/core/outing/overdue-steps';
import { reader } from '@/db/client';
import { claims, outbox, outings, overdueSteps, sits } from '@/db/schema';
import { windowsHeld } from '@/features/bookings/words/sits';
import type { ClubScope } from '@/server/scope';

type Sit = typeof sits.$inferSelect;

function twice(keys: string[]): string[] {
  const seen = new Set<string>();
  return keys.filter((key) => seen.size === seen.add(key).size);
}

const slots = (sit: Sit) => windowsHeld(sit.windows).map((window) => `${sit.day} ${window}`);

function brokenRests(booked: Sit[], restDays: number): string[] {
  return booked.flatMap((a) =>
    booked
      .filter((b) => b.standId === a.standId && b.day > a.day && daysBetween(a.day, b.day) <= restDays)
      .map((b) => `${a.id} on ${a.day} and ${b.id} on ${b.day}`),
  );
}

/** What may never be so, at any hour, killed or not. Empty when all is well. */
export async function seasonFaults(scope: ClubScope, at: number): Promise<string[]> {
  const { club } = scope;
  const since = addDays(dayOf(at, club.zone), -6);
  const near = await reader()
    .select()
    .from(sits)
    .where(and(eq(sits.clubId, club.id), gte(sits.day, since)));
  const booked = near.filter((sit) => sit.status === 'booked');
  const held = await reader()
    .select()
    .from(claims)
    .where(and(eq(claims.clubId, club.id), gte(claims.day, since)));
  const wanted = booked.flatMap((sit) => slots(sit).map((slot) => `${sit.id} ${sit.standId} ${sit.memberId} ${slot}`));
  const found = held.map((row) => `${row.sitId} ${row.standId} ${row.memberId} ${row.day} ${row.window}`);
  const rows = await reader().select().from(outings).where(eq(outings.clubId, club.id));
  const open = rows.filter((row) => row.signedOutAt === null);
  return [
    ...twice(booked.flatMap((sit) => slots(sit).map((slot) => `stand twice: ${sit.standId} ${slot}`))),
    ...twice(booked.flatMap((sit) => slots(sit).map((slot) => `member twice: ${sit.memberId} ${slot}`))),
    ...wanted.filter((key) => !found.includes(key)).map((key) => `claim missing: ${key}`),
    ...found.filter((key) => !wanted.includes(key)).map((key) => `claim left: ${key}`),
    ...brokenRests(booked, club.rules.restDaysDefault).map((text) => `rest broken: ${text}`),
    ...twice(open.map((row) => `signed in twice: ${row.memberId}`)),
    ...rows.filter((row) => row.backBy < row.firstBackBy).map((row) => `back-by before the first: ${row.id}`),
    ...(await stepFaults(scope, rows, at)),
  ];
}

/** Steps taken before their time, and steps whose mail is not in the outbox. */
async function stepFaults(scope: ClubScope, rows: (typeof outings.$inferSelect)[], at: number): Promise<string[]> {
  const steps = await reader().select().from(overdueSteps).where(eq(overdueSteps.clubId, scope.club.id));
  const mails = await reader().select({ key: outbox.dedupeKey }).from(outbox).where(eq(outbox.clubId, scope.club.id));
  const mailed = new Set(mails.map(({ key }) => /^overdue:(.*):[^:]+$/.exec(key)?.[1]));
  return steps.flatMap((step) => {
    const outing = rows.find((row) => row.id === step.outingId);
    const current = outing && outing.moves === step.moves && outing.signedOutAt === null;
    return [
      ...(current && !dueSteps(outing.backBy, scope.club.rules, at).includes(step.step)
        ? [`too early: ${step.id}`]
        : []),
      ...(step.outcome === 'mailed' && !mailed.has(step.id) ? [`step without mail: ${step.id}`] : []),
    ];
  });
}

/** What must have been done by an hour in which no process was killed. */
export async function seasonLeftUndone(scope: ClubScope, at: number): Promise<string[]> {
  const { club } = scope;
  const booked = await reader()
    .select()
    .from(sits)
    .where(and(eq(sits.clubId, club.id), eq(sits.status, 'booked'), gte(sits.endAt, at)));
  const rows = await reader().select().from(outings).where(eq(outings.clubId, club.id));
  const signed = new Set(rows.map((row) => row.sitId));
  const steps = await reader().select().from(overdueSteps).where(eq(overdueSteps.clubId, club.id));
  const taken = new Set(steps.map((step) => step.id));
  const waiting = await reader().select().from(outbox).where(eq(outbox.clubId, club.id));
  return [
    ...booked
      .filter((sit) => {
        const lapses = lapsesAt(sit, club.rules.holdMinutes);
        return sit.endAt > at && lapses !== null && lapses <= at && !signed.has(sit.id);
      })
      .map((sit) => `not lapsed: ${sit.id}`),
    ...rows
      .filter((row) => row.signedOutAt === null)
      .flatMap((row) => dueSteps(row.backBy, club.rules, at).map((step) => `${row.id}:${row.moves}:${step}`))
      .filter((id) => !taken.has(id))
      .map((id) => `not told: ${id}`),
    ...waiting.filter((mail) => mail.sentAt === null && mail.createdAt < at).map((mail) => `not sent: ${mail.id}`),
  ];
}
