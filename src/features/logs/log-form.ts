import { dayOf, formatClock } from '@/core/day-time';
import type { LogForm } from './log-schema';
import type { LogRow } from './logs-data';

const STEP_MS = 5 * 60_000;

interface SitSpan {
  id: string;
  day: string;
  startAt: number;
  endAt: number;
}

/** Signed in first and out last; nulls where nobody did. */
interface OutingSpan {
  inAt: number | null;
  outAt: number | null;
}

/**
 * Hours a new log starts from: those of the sit, cut to when its member signed in and out, and to now while it still goes
 * on; all that where it leaves at least five minutes, else the sit's own, or its first five minutes when it has only begun:
 * a log of hours to come is refused.
 */
export function proposedSpan(sit: SitSpan, outing: OutingSpan, now: number): { startAt: number; endAt: number } {
  const startAt = Math.max(sit.startAt, outing.inAt ?? sit.startAt);
  const ended = Math.min(sit.endAt, outing.outAt ?? sit.endAt, now);
  const endAt = ended === sit.endAt ? ended : Math.floor(ended / STEP_MS) * STEP_MS;
  if (endAt - startAt >= STEP_MS) return { startAt, endAt };
  return { startAt: sit.startAt, endAt: now < sit.endAt ? sit.startAt + STEP_MS : sit.endAt };
}

/** A clock of the sit's own day: what lies beyond midnight is shown as its last minute. */
function clockOn(day: string, at: number, zone: string): string {
  if (dayOf(at, zone) > day) return '23:59';
  return dayOf(at, zone) < day ? '00:00' : formatClock(at, zone);
}

export function newLogForm(sit: SitSpan, outing: OutingSpan, now: number, zone: string): LogForm {
  const { startAt, endAt } = proposedSpan(sit, outing, now);
  return {
    sitId: sit.id,
    version: 0,
    startClock: clockOn(sit.day, startAt, zone),
    endClock: clockOn(sit.day, endAt, zone),
    antleredBucks: 0,
    does: 0,
    fawns: 0,
    unknown: 0,
    bumpedIn: 0,
    bumpedSitting: 0,
    bumpedOut: 0,
    bumpedWhere: '',
    shot: 'none',
    shotClock: '',
    hitPlace: '',
    followUp: '',
    followUpNotes: '',
    notes: '',
  };
}

export function logFormOf(sit: SitSpan, log: LogRow, zone: string): LogForm {
  const clock = (at: number) => clockOn(sit.day, at, zone);
  const { antleredBucks, does, fawns, unknown, bumpedIn, bumpedSitting, bumpedOut } = log;
  return {
    sitId: sit.id,
    version: log.version,
    startClock: clock(log.startAt),
    endClock: clock(log.endAt),
    ...{ antleredBucks, does, fawns, unknown, bumpedIn, bumpedSitting, bumpedOut },
    bumpedWhere: log.bumpedWhere,
    shot: log.shot,
    shotClock: log.shotAt === null ? '' : clock(log.shotAt),
    hitPlace: log.hitPlace ?? '',
    followUp: log.followUp ?? '',
    followUpNotes: log.followUpNotes,
    notes: log.notes,
  };
}
