import { and, asc, desc, eq, gt, gte, isNotNull, isNull, lte, max, min, or } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { memberships, outings, type SitLogSnapshot, sitLogs, sitLogVersions, sits, stands, users } from '@/db/schema';
import { newId } from '@/lib/ids';
import type { ClubScope } from '@/server/scope';

export type LogRow = typeof sitLogs.$inferSelect;
export type NewLog = typeof sitLogs.$inferInsert;

interface Days {
  fromDay: string;
  toDay: string;
}

function selectSits(from: ReadFrom) {
  return from
    .select({
      id: sits.id,
      day: sits.day,
      windows: sits.windows,
      startAt: sits.startAt,
      endAt: sits.endAt,
      status: sits.status,
      standId: sits.standId,
      standName: stands.name,
      memberId: sits.memberId,
      memberName: users.name,
      memberEmail: users.email,
      memberRole: memberships.role,
      sponsorId: memberships.sponsorId,
      log: sitLogs,
    })
    .from(sits)
    .innerJoin(stands, eq(stands.id, sits.standId))
    .innerJoin(memberships, eq(memberships.id, sits.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(sitLogs, eq(sitLogs.sitId, sits.id));
}

/** A sit with its log, if there is one. */
export type LoggableSit = Awaited<ReturnType<typeof selectSits>>[number];
export type LoggedSit = LoggableSit & { log: LogRow };

const booked = (scope: ClubScope) => and(eq(sits.clubId, scope.club.id), eq(sits.status, 'booked'));

/** A member's own sits and those of guests whom the member answers for. */
const ownSits = (memberId: string) =>
  or(eq(sits.memberId, memberId), and(eq(memberships.role, 'guest'), eq(memberships.sponsorId, memberId)));

export async function findLoggable(scope: ClubScope, sitId: string, from: ReadFrom = reader()) {
  const [row] = await selectSits(from).where(and(eq(sits.clubId, scope.club.id), eq(sits.id, sitId)));
  return row ?? null;
}

/** Own sits that have begun since an instant and have no log, the latest first. */
export function listWaiting(scope: ClubScope, span: { from: number; now: number }, from: ReadFrom = reader()) {
  return selectSits(from)
    .where(
      and(
        booked(scope),
        ownSits(scope.member.id),
        isNull(sitLogs.sitId),
        gt(sits.endAt, span.from),
        lte(sits.startAt, span.now),
      ),
    )
    .orderBy(desc(sits.startAt));
}

/** Sits that ended between two instants and have no log: whoever's they are, as long as they are in the club. */
export function listUnlogged(scope: ClubScope, span: { from: number; until: number }, from: ReadFrom = reader()) {
  return selectSits(from)
    .where(
      and(
        booked(scope),
        isNull(sitLogs.sitId),
        isNull(memberships.removedAt),
        gt(sits.endAt, span.from),
        lte(sits.endAt, span.until),
      ),
    )
    .orderBy(asc(sits.endAt), asc(sits.id));
}

/** Sits of some days that have ended, with or without a log, the latest first; of everybody, or one's own. */
export function listEnded(scope: ClubScope, ask: Days & { now: number; own: boolean }, from: ReadFrom = reader()) {
  return selectSits(from)
    .where(
      and(
        booked(scope),
        gte(sits.day, ask.fromDay),
        lte(sits.day, ask.toDay),
        lte(sits.endAt, ask.now),
        ask.own ? ownSits(scope.member.id) : undefined,
      ),
    )
    .orderBy(desc(sits.startAt), asc(stands.name));
}

/** Sits with a log on the days given, the latest first; of everybody, or one's own. */
export async function listLogged(
  scope: ClubScope,
  ask: Days & { own: boolean; most?: number },
  from: ReadFrom = reader(),
): Promise<LoggedSit[]> {
  const rows = await selectSits(from)
    .where(
      and(
        booked(scope),
        gte(sits.day, ask.fromDay),
        lte(sits.day, ask.toDay),
        isNotNull(sitLogs.sitId),
        ask.own ? ownSits(scope.member.id) : undefined,
      ),
    )
    .orderBy(desc(sits.startAt), asc(stands.name))
    .limit(ask.most ?? 20_000);
  return rows.flatMap((row) => (row.log ? [{ ...row, log: row.log }] : []));
}

/** First day of the club's first log; null while there is none. */
export async function findFirstLoggedDay(scope: ClubScope, from: ReadFrom = reader()): Promise<string | null> {
  const [row] = await from
    .select({ day: min(sits.day) })
    .from(sitLogs)
    .innerJoin(sits, eq(sits.id, sitLogs.sitId))
    .where(booked(scope));
  return row?.day ?? null;
}

/** When somebody signed in first and out last for a sit; nulls where nobody did. */
export async function findOutingSpan(scope: ClubScope, sitId: string, from: ReadFrom = reader()) {
  const [row] = await from
    .select({ inAt: min(outings.signedInAt), outAt: max(outings.signedOutAt) })
    .from(outings)
    .where(and(eq(outings.clubId, scope.club.id), eq(outings.sitId, sitId)));
  return { inAt: row?.inAt ?? null, outAt: row?.outAt ?? null };
}

export async function insertLog(tx: Tx, row: NewLog): Promise<void> {
  await tx.insert(sitLogs).values(row);
}

export async function updateLog(scope: ClubScope, tx: Tx, sitId: string, set: Partial<NewLog>): Promise<void> {
  await tx
    .update(sitLogs)
    .set(set)
    .where(and(eq(sitLogs.clubId, scope.club.id), eq(sitLogs.sitId, sitId)));
}

/** Keeps a log as it stood before a change. */
export async function keepVersion(
  scope: ClubScope,
  tx: Tx,
  kept: { sitId: string; savedBy: string; savedAt: number; log: SitLogSnapshot },
): Promise<void> {
  const { version } = kept.log;
  await tx.insert(sitLogVersions).values({ ...kept, id: newId('logVersion'), clubId: scope.club.id, version });
}

/** What a log said before, the latest first, with who had saved it so. */
export function listVersions(scope: ClubScope, sitId: string, from: ReadFrom = reader()) {
  return from
    .select({
      version: sitLogVersions.version,
      savedAt: sitLogVersions.savedAt,
      savedByName: users.name,
      log: sitLogVersions.log,
    })
    .from(sitLogVersions)
    .innerJoin(memberships, eq(memberships.id, sitLogVersions.savedBy))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(sitLogVersions.clubId, scope.club.id), eq(sitLogVersions.sitId, sitId)))
    .orderBy(desc(sitLogVersions.version));
}

/** Somebody who is or was in the club. */
export async function findPerson(scope: ClubScope, memberId: string, from: ReadFrom = reader()) {
  const [row] = await from
    .select({ name: users.name, email: users.email, removedAt: memberships.removedAt })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.clubId, scope.club.id), eq(memberships.id, memberId)));
  return row ?? null;
}
