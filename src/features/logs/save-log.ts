import { isDeepStrictEqual } from 'node:util';
import { localToUtc } from '@/core/day-time';
import { write } from '@/db/client';
import type { SitLogSnapshot } from '@/db/schema';
import { dayAndWindow } from '@/features/bookings/words/sits';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { foundSent, noteSent } from '@/server/sent-requests';
import { mayWriteLog } from './log-access';
import type { LogInput } from './log-schema';
import {
  findLoggable,
  findPerson,
  insertLog,
  keepVersion,
  type LoggableSit,
  type LogRow,
  updateLog,
} from './logs-data';
import { LOG_AUDIT, LOG_ERRORS } from './words/form';

/** A phone's clock may run ahead of the server's by a little. */
const AHEAD_MS = 15 * 60_000;

type LogFacts = Omit<SitLogSnapshot, 'version' | 'savedBy' | 'updatedAt'>;

function factsOf(sit: LoggableSit, input: LogInput, zone: string): LogFacts {
  const { sitId: _, version: __, sent: ___, startClock, endClock, shotClock, ...rest } = input;
  const at = (clock: string) => localToUtc(sit.day, clock, zone);
  const hit = rest.shot === 'hit';
  const bumped = rest.bumpedIn + rest.bumpedSitting + rest.bumpedOut > 0;
  return {
    ...rest,
    startAt: at(startClock),
    endAt: at(endClock),
    bumpedWhere: bumped ? rest.bumpedWhere : '',
    shotAt: rest.shot === 'none' ? null : at(shotClock),
    hitPlace: hit ? rest.hitPlace : null,
    followUp: hit ? rest.followUp : null,
    followUpNotes: hit ? rest.followUpNotes : '',
  };
}

function snapshotOf({ sitId: _, clubId: __, createdAt: ___, ...log }: LogRow): SitLogSnapshot {
  return log;
}

function sameFacts(log: LogRow, facts: LogFacts): boolean {
  const { version: _, savedBy: __, updatedAt: ___, ...was } = snapshotOf(log);
  return isDeepStrictEqual(was, facts);
}

function refuse(scope: ClubScope, sit: LoggableSit, facts: LogFacts, now: number): void {
  if (!mayWriteLog(scope, sit, now)) {
    throw new AppError('forbidden', LOG_ERRORS.notYours(sit.memberName));
  }
  if (sit.status !== 'booked') {
    throw new AppError('conflict', sit.status === 'lapsed' ? LOG_ERRORS.lapsed : LOG_ERRORS.cancelled);
  }
  if (sit.startAt > now) throw new AppError('conflict', LOG_ERRORS.notBegun);
  const late = (at: number | null) => at !== null && at > now + AHEAD_MS;
  const message = LOG_ERRORS.toCome;
  if (late(facts.endAt)) throw new AppError('invalid', message, { fields: { endClock: message } });
  if (late(facts.shotAt)) throw new AppError('invalid', message, { fields: { shotClock: message } });
}

export interface SavedLog {
  sitId: string;
  version: number;
  standName: string;
  /** A deer was recovered: its harvest sheet comes next. */
  recovered: boolean;
}

/**
 * Writes the log of a sit, or changes it and keeps what it said before. The audit row says that it was done and never what
 * was seen: the club's rule may keep that from those who read the audit log.
 */
export async function saveLog(scope: ClubScope, input: LogInput, now: number): Promise<SavedLog> {
  return write(async (tx) => {
    const sit = await findLoggable(scope, input.sitId, tx);
    if (!sit) throw notFound();
    const facts = factsOf(sit, input, scope.club.zone);
    refuse(scope, sit, facts, now);
    const saved = (version: number): SavedLog => ({
      sitId: sit.id,
      version,
      standName: sit.standName,
      recovered: facts.followUp === 'recovered',
    });
    const before = sit.log;
    if (before && (await foundSent(tx, scope, input.sent, 'log')) === sit.id) return saved(before.version);
    if (before && sameFacts(before, facts)) return saved(before.version);
    if ((before?.version ?? 0) !== input.version) {
      const by = before && (await findPerson(scope, before.savedBy ?? sit.memberId, tx));
      throw new AppError('conflict', LOG_ERRORS.changed(by?.name ?? null));
    }
    const version = input.version + 1;
    if (before) {
      const savedBy = before.savedBy ?? sit.memberId;
      const savedAt = before.updatedAt ?? before.createdAt;
      await keepVersion(scope, tx, { sitId: sit.id, savedBy, savedAt, log: snapshotOf(before) });
      await updateLog(scope, tx, sit.id, { ...facts, version, savedBy: scope.member.id, updatedAt: now });
    } else {
      const row = { ...facts, sitId: sit.id, clubId: scope.club.id, version, savedBy: scope.member.id, createdAt: now };
      await insertLog(tx, row);
    }
    await noteSent(tx, scope, input.sent, { kind: 'log', subjectId: sit.id }, now);
    const verb = before ? 'changed' : 'written';
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: `log.${verb}`,
        subjectType: 'sit',
        subjectId: sit.id,
        summary: LOG_AUDIT[verb](sit.memberName, sit.standName, dayAndWindow(sit.day, sit.windows, true)),
        detail: { version },
      },
      now,
    );
    return saved(version);
  });
}
