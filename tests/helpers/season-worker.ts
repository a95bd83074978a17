import { createInterface } from 'node:readline';
import { addDays, dayOf, formatClock } from '@/core/day-time';
import { closeDatabase } from '@/db/client';
import { bookSit } from '@/features/bookings/book-sit';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { listBookedSits, type SitDetail } from '@/features/bookings/data';
import { bookSitSchema } from '@/features/bookings/sit-schema';
import { type Dice, makeDice } from '@/features/demo/dice';
import { listOpenOutings, listOutingsOf, type OutingDetail } from '@/features/outings/data';
import { moveBackBy } from '@/features/outings/move-back-by';
import { signInSitSchema, walkUpSchema } from '@/features/outings/outing-schema';
import { signIn } from '@/features/outings/sign-in';
import { signOut } from '@/features/outings/sign-out';
import { walkUp } from '@/features/outings/walk-up';
import { runDueJobs } from '@/jobs/run-due-jobs';
import { BOARD_JOBS, MAIL_JOB } from '@/jobs/urgent-jobs';
import { setClock } from '@/server/clock';
import { AppError } from '@/server/errors';
import { type ClubScope, findScope } from '@/server/scope';

/** What one process of a simulated season is told at its start. */
export interface SeasonOrder {
  slug: string;
  userIds: string[];
  standIds: string[];
}

const HOUR = 3_600_000;
const order: SeasonOrder = JSON.parse(process.argv[2] ?? '{}');
const jobs = [...BOARD_JOBS, MAIL_JOB];
const tally: Record<string, number> = {};
const say = (line: string) => process.stdout.write(`${line}\n`);

/** Does one thing, as a person would; a refusal by a rule is one of the ways it may end. */
async function act(name: string, work: () => Promise<unknown>): Promise<void> {
  say(`doing ${name}`);
  const ending = await work().then(
    () => 'done',
    (error: unknown) => {
      if (error instanceof AppError && ['conflict', 'invalid', 'forbidden'].includes(error.code)) return error.code;
      throw error;
    },
  );
  tally[`${name} ${ending}`] = (tally[`${name} ${ending}`] ?? 0) + 1;
}

async function book(scope: ClubScope, dice: Dice, at: number): Promise<void> {
  const values = {
    standId: dice.pick(order.standIds),
    day: addDays(dayOf(at, scope.club.zone), dice.whole(0, 3)),
    windows: dice.pick(['morning', 'evening', 'evening', 'all_day'] as const),
    weapon: 'bow',
    requestKey: dice.requestKey(),
  };
  await act('book', () => bookSit(scope, bookSitSchema.parse(values), at));
}

/** What the members of this process see when the hour begins; what they do is checked by the rules as ever. */
interface Sight {
  open: OutingDetail[];
  sits: SitDetail[];
  signed: Set<string>;
}

async function lookAround(scope: ClubScope, at: number): Promise<Sight> {
  const today = dayOf(at, scope.club.zone);
  const sits = (await listBookedSits(scope, { fromDay: today, toDay: addDays(today, 3) })).filter(
    (sit) => sit.endAt > at,
  );
  const outings = await listOutingsOf(
    scope,
    sits.map((sit) => sit.id),
  );
  return { sits, signed: new Set(outings.map((outing) => outing.sitId)), open: await listOpenOutings(scope) };
}

async function onTheGround(scope: ClubScope, mine: OutingDetail, dice: Dice, at: number): Promise<void> {
  const late = at >= mine.backBy;
  if (dice.chance(late ? 0.45 : 0.04)) await act('sign out', () => signOut(scope, { outingId: mine.id }, at));
  else if (dice.chance(late ? 0.15 : 0.01)) {
    const move = { outingId: mine.id, minutes: dice.pick(['30', '60', '120'] as const), tracking: dice.chance(0.7) };
    await act('move', () => moveBackBy(scope, move, at));
  }
}

async function atTheGate(scope: ClubScope, { sits, signed }: Sight, dice: Dice, at: number): Promise<void> {
  const mine = sits.filter((sit) => sit.memberId === scope.member.id);
  const next = mine[0];
  const backBy = formatClock((next?.endAt ?? at + 3 * HOUR) + HOUR / 2, scope.club.zone);
  if (next && next.startAt - HOUR <= at && !signed.has(next.id)) {
    if (!dice.chance(0.55)) return;
    const values = { sitId: next.id, backBy, vehicle: 'grey truck', contactOff: dice.chance(0.1) };
    await act('sign in', () => signIn(scope, signInSitSchema.parse(values), at));
  } else if (mine.length > 0 && dice.chance(0.02)) {
    const sitId = dice.pick(mine).id;
    await act('cancel', () => cancelSit(scope, { sitId, reason: '' }, at));
  } else if (dice.chance(0.02)) {
    const values = { standId: dice.pick(order.standIds), weapon: 'bow', requestKey: dice.requestKey(), backBy };
    await act('walk up', () => walkUp(scope, walkUpSchema.parse(values), at));
  }
}

/** The same hour gives the same chances: a process started anew presses the same buttons again. */
async function liveHour(scopes: ClubScope[], at: number): Promise<void> {
  setClock(() => at);
  const [first] = scopes;
  if (!first) throw new Error('A process of the season has no members.');
  const sight = await lookAround(first, at);
  const hour = Number(formatClock(at, first.club.zone).slice(0, 2));
  // Asleep; whoever is still out may yet come in.
  const night = hour >= 23 || hour < 4;
  for (const scope of scopes) {
    const dice = makeDice(`${scope.member.userId} ${at}`);
    const mine = sight.open.find((outing) => outing.memberId === scope.member.id);
    if (!night && dice.chance(0.035)) await book(scope, dice, at);
    if (mine) await onTheGround(scope, mine, dice, at);
    else if (!night) await atTheGate(scope, sight, dice, at);
  }
  say('doing jobs');
  for (const { id, error } of await runDueJobs(at, jobs)) if (error) throw new Error(`${id}: ${error}`);
}

async function scopeOf(userId: string): Promise<ClubScope> {
  const scope = await findScope(order.slug, userId);
  if (!scope) throw new Error('A member of the season is gone.');
  return scope;
}

const scopes = await Promise.all(order.userIds.map(scopeOf));
say('ready');
for await (const line of createInterface({ input: process.stdin })) {
  if (line === 'end') break;
  await liveHour(scopes, Number(line));
  say(`lived ${line}`);
}
say(`tally ${JSON.stringify(tally)}`);
await closeDatabase();
