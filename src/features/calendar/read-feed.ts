import { createHash } from 'node:crypto';
import { addDays, dayOf } from '@/core/day-time';
import { can } from '@/core/permissions';
import { listSitsSince } from '@/features/bookings/data';
import { type CalendarEntry, sitCalendar } from '@/features/bookings/sit-calendar';
import { listWorkDaysSince, type WorkDayRow } from '@/features/chores/work-days-data';
import { hashSecret } from '@/lib/secrets';
import { notFound } from '@/server/errors';
import { systemScopeById } from '@/server/scope';
import { findLiveFeed } from './data';
import { entryFor } from './entry-for';
import { FEED_PERMISSIONS } from './feed-permission';
import { CALENDAR_ENTRY_WORDS, FEED_NAMES } from './words';

/** Cancelled sits stay this long, so that a calendar that looks seldom still learns of them. */
const DAYS_BACK = 120;
const REFRESH_SECONDS = 30 * 60;

/** A work day as an entry beside the sits. */
function workDayEntry(row: WorkDayRow, club: { name: string }): CalendarEntry {
  const { meet, notes } = row;
  return {
    sit: { ...row, status: row.cancelledAt === null ? 'booked' : 'cancelled' },
    shown: {
      summary: `${row.title}, ${club.name}`,
      description: [meet && CALENDAR_ENTRY_WORDS.meetAt(meet), notes].filter(Boolean).join('\n'),
      location: meet || null,
      place: null,
    },
  };
}

export interface FeedBody {
  body: string;
  etag: string;
}

/** The calendar behind a secret; turned off, unknown, or its owner gone or no longer entitled: nothing is there. */
export async function readFeed(secret: string, now: number): Promise<FeedBody> {
  const found = await findLiveFeed(hashSecret(secret));
  if (!found || !can(found.role, FEED_PERMISSIONS[found.feed.scope])) throw notFound();
  const { feed } = found;
  const scope = await systemScopeById(feed.clubId);
  const { club } = scope;
  const fromDay = addDays(dayOf(now, club.zone), -DAYS_BACK);
  const sits = await listSitsSince(scope, fromDay, feed.scope === 'own' ? feed.memberId : null);
  const workDays = can(found.role, 'chores.read') ? await listWorkDaysSince(scope, fromDay) : [];
  const reader = { memberId: feed.memberId, privacy: club.rules.calendarPrivacy, withPlace: feed.withPlace };
  const body = sitCalendar({
    name: `${club.name}: ${FEED_NAMES[feed.scope]}`,
    method: 'PUBLISH',
    refreshSeconds: REFRESH_SECONDS,
    entries: [
      ...sits.map((sit) => ({ sit, shown: entryFor(sit, club, reader) })),
      ...workDays.map((row) => workDayEntry(row, club)),
    ],
  });
  return { body, etag: `"${createHash('sha256').update(body).digest('base64url').slice(0, 27)}"` };
}

/** RFC 9110 13.1.2: a list of tags compared weakly, or any. */
export function etagMatches(ifNoneMatch: string | null, etag: string): boolean {
  if (ifNoneMatch === null) return false;
  const tags = ifNoneMatch.split(',').map((tag) => tag.trim().replace(/^W\//, ''));
  return tags.includes('*') || tags.includes(etag);
}
