import { addDays, dayOf } from '@/core/day-time';
import type { FollowUp, HitPlace, Shot } from '@/core/log/follow-up';
import { clockText, dayAndWindow, spanText } from '@/features/bookings/words/sits';
import { momentText } from '@/features/clubs/words/audit-text';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope, ScopeClub } from '@/server/scope';
import { maySeeLog, mayWriteLog } from './log-access';
import { logFormOf, newLogForm } from './log-form';
import type { LogForm } from './log-schema';
import {
  findLoggable,
  findOutingSpan,
  findPerson,
  type LoggableSit,
  listEnded,
  listLogged,
  listVersions,
  listWaiting,
} from './logs-data';
import { listVisitLines, type VisitLine } from './visits-reads';
import { LOG_ERRORS } from './words/form';
import { bumpsText, countsText, shotText } from './words/log';
import { LOG_HISTORY_WORDS } from './words/screen';

const DAY_MS = 86_400_000;
/** A sit older than this is no longer asked about; it can still be opened and logged. */
const ASK_FOR_DAYS = 60;
/** How far back officers look for missing logs. */
const OFFICERS_DAYS = 14;
const MOST_OWN = 40;

export interface WaitingLine {
  sitId: string;
  standName: string;
  /** Set when it is a guest's. */
  memberName: string | null;
  whenText: string;
  timeText: string;
}

export interface LogLine {
  sitId: string;
  standName: string;
  memberName: string;
  whenText: string;
  timeText: string;
  counts: string;
  bumps: string;
  shot: string;
  notes: string;
  /** A deer is still being waited for or tracked. */
  open: boolean;
}

/** Officers see that a log exists, whatever the club's rule. */
export interface ClubLogLine {
  sitId: string;
  standName: string;
  memberName: string;
  whenText: string;
  logged: boolean;
  /** null: kept from this reader by the club's rule. */
  counts: string | null;
  mayOpen: boolean;
}

export interface LogScreen {
  waiting: WaitingLine[];
  mine: LogLine[];
  /** null: the reader is no officer. */
  club: ClubLogLine[] | null;
  visits: VisitLine[];
}

interface LogFacts {
  startAt: number;
  endAt: number;
  antleredBucks: number;
  does: number;
  fawns: number;
  unknown: number;
  bumpedIn: number;
  bumpedSitting: number;
  bumpedOut: number;
  bumpedWhere: string;
  shot: Shot;
  hitPlace: HitPlace | null;
  followUp: FollowUp | null;
  notes: string;
}

type SitHead = Pick<LoggableSit, 'id' | 'day' | 'windows' | 'standName' | 'memberName'>;

function head(sit: SitHead) {
  const { id: sitId, standName, memberName } = sit;
  return { sitId, standName, memberName, whenText: dayAndWindow(sit.day, sit.windows, true) };
}

export function logLine(club: ScopeClub, sit: SitHead, log: LogFacts): LogLine {
  return {
    ...head(sit),
    timeText: spanText(log.startAt, log.endAt, club),
    counts: countsText(log),
    bumps: bumpsText(log),
    shot: shotText(log),
    notes: log.notes,
    open: log.followUp === 'waiting',
  };
}

async function readClubLogs(scope: ClubScope, now: number): Promise<ClubLogLine[]> {
  const toDay = dayOf(now, scope.club.zone);
  const sits = await listEnded(scope, { fromDay: addDays(toDay, -OFFICERS_DAYS), toDay, now, own: false });
  return sits.map((sit) => ({
    ...head(sit),
    logged: sit.log !== null,
    counts: sit.log && maySeeLog(scope, sit, now) ? countsText(sit.log) : null,
    mayOpen: sit.log ? maySeeLog(scope, sit, now) : mayWriteLog(scope, sit, now),
  }));
}

/** What waits to be written, what was written of late, and other visits. */
export async function readLogScreen(scope: ClubScope, now: number): Promise<LogScreen> {
  const { club, member } = scope;
  const waiting = await listWaiting(scope, { from: now - ASK_FOR_DAYS * DAY_MS, now });
  const today = dayOf(now, club.zone);
  const logged = await listLogged(scope, {
    fromDay: addDays(today, -366),
    toDay: today,
    own: true,
    most: MOST_OWN,
  });
  return {
    waiting: waiting.map((sit) => ({
      ...head(sit),
      memberName: sit.memberId === member.id ? null : sit.memberName,
      timeText: spanText(sit.startAt, sit.endAt, club),
    })),
    mine: logged.map((sit) => logLine(club, sit, sit.log)),
    club: scope.can('log.write_any') ? await readClubLogs(scope, now) : null,
    visits: await listVisitLines(scope, now),
  };
}

export interface HistoryLine {
  version: number;
  /** 'Ann Roe, Sat 7 Nov 2026, 6:05 AM' */
  savedText: string;
  line: LogLine;
}

export interface LogScreenOf {
  sitId: string;
  day: string;
  standName: string;
  /** Set when it is somebody else's. */
  memberName: string | null;
  whenText: string;
  timeText: string;
  zone: string;
  units: 'us' | 'metric';
  /** null: may be read and not changed. */
  form: LogForm | null;
  /** null: not written yet. */
  written: HistoryLine | null;
  /** What it said before, the latest first. */
  history: HistoryLine[];
}

/** One sit's log: the form to write or change it, and what it said before. */
export async function readLog(scope: ClubScope, sitId: string, now: number): Promise<LogScreenOf> {
  const { club, member } = scope;
  const sit = await findLoggable(scope, sitId);
  if (sit?.status !== 'booked') throw notFound();
  const mayWrite = mayWriteLog(scope, sit, now);
  if (sit.log ? !maySeeLog(scope, sit, now) : !mayWrite) throw notFound();
  if (sit.startAt > now) {
    throw new AppError('not_found', LOG_ERRORS.beginsAt(clockText(sit.startAt, club)));
  }
  const historyLine = (version: number, name: string, at: number, log: LogFacts): HistoryLine => ({
    version,
    savedText: LOG_HISTORY_WORDS.saved(name, momentText(at, club)),
    line: logLine(club, sit, log),
  });
  const { log } = sit;
  const versions = log ? await listVersions(scope, sitId) : [];
  const saver = log ? ((await findPerson(scope, log.savedBy ?? sit.memberId))?.name ?? sit.memberName) : '';
  const blank = () => findOutingSpan(scope, sitId).then((span) => newLogForm(sit, span, now, club.zone));
  const form = log ? logFormOf(sit, log, club.zone) : await blank();
  return {
    ...head(sit),
    day: sit.day,
    memberName: sit.memberId === member.id ? null : sit.memberName,
    timeText: spanText(sit.startAt, sit.endAt, club),
    zone: club.zone,
    units: club.units,
    form: mayWrite ? form : null,
    written: log && historyLine(log.version, saver, log.updatedAt ?? log.createdAt, log),
    history: versions.map((one) => historyLine(one.version, one.savedByName, one.savedAt, one.log)),
  };
}
