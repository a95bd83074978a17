import { findNewAudit } from '@/db/queries/audit';
import { findForecastMark } from '@/features/weather/data';
import { placeKey } from '@/features/weather/place-key';
import { currentWeather } from '@/features/weather/refresh-forecast';
import type { ClubScope } from '@/server/scope';

const MINUTE_MS = 60_000;
const MOST_KEPT = 300;

interface Kept<T> {
  value: T;
  /** The newest audit row when the read began. */
  seen: number;
  forecast: string;
}

async function forecastMark({ club }: ClubScope): Promise<string> {
  const mark = await findForecastMark(placeKey(currentWeather().source, club));
  return JSON.stringify(mark);
}

/** All that the answer hangs on beside the database: the reader, the question, and the clock by the minute. */
function keyOf(scope: ClubScope, ask: object, now: number): string {
  const { club, member } = scope;
  const reader = [
    member.id,
    member.userId,
    member.role,
    member.name,
    member.sponsorId,
    member.guestFrom,
    member.guestTo,
  ];
  return JSON.stringify([club.id, club.version, club.units, reader, ask, Math.floor(now / MINUTE_MS)]);
}

/**
 * The same read once a minute at most while nothing changes. Every change of a club, an account or a place writes an audit
 * row in its own transaction, so a newer row of this club or of none drops what was kept; so does a newer forecast. Each
 * reader's answer is kept apart, and so is each club's. A memo only: another process works out the same.
 */
export function keepReads<Ask extends object, T>(read: (scope: ClubScope, ask: Ask, now: number) => Promise<T>) {
  const kept = new Map<string, Kept<T>>();
  return async (scope: ClubScope, ask: Ask, now: number): Promise<T> => {
    const key = keyOf(scope, ask, now);
    const known = kept.get(key);
    const { newest, own } = await findNewAudit(scope.club.id, known?.seen ?? null);
    const forecast = await forecastMark(scope);
    if (known && !own && known.forecast === forecast) {
      known.seen = newest;
      return known.value;
    }
    const value = await read(scope, ask, now);
    kept.delete(key);
    // A read may itself have fetched a forecast: what was seen before it is then no mark of what it read.
    if ((await forecastMark(scope)) === forecast) kept.set(key, { value, seen: newest, forecast });
    for (const oldest of kept.keys()) {
      if (kept.size <= MOST_KEPT) break;
      kept.delete(oldest);
    }
    return value;
  };
}
