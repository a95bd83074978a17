import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { WINDOW_NAMES } from '@/core/condition-types';
import { WEAPONS } from '@/core/ground-types';
import { FOLLOW_UPS, HIT_PLACES, SHOTS } from '@/core/log/follow-up';
import { clubs, memberships } from './clubs';
import { approaches, stands } from './ground';

export interface SitGuest {
  name: string;
  /** Set when the guest has an account in the club. */
  memberId: string | null;
}

export const sits = sqliteTable(
  'sits',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    standId: text()
      .notNull()
      .references(() => stands.id),
    memberId: text()
      .notNull()
      .references(() => memberships.id),
    /** YYYY-MM-DD in the club's zone. */
    day: text().notNull(),
    windows: text({ enum: [...WINDOW_NAMES, 'all_day'] }).notNull(),
    startAt: integer().notNull(),
    endAt: integer().notNull(),
    weapon: text({ enum: WEAPONS }).notNull(),
    approachId: text().references(() => approaches.id),
    guests: text({ mode: 'json' }).$type<SitGuest[]>().notNull(),
    note: text().notNull().default(''),
    /** lapsed: nobody signed in within the club's hold time. */
    status: text({ enum: ['booked', 'cancelled', 'lapsed'] }).notNull(),
    cancelReason: text(),
    cancelledAt: integer(),
    /** One value for one press of the button: a second arrival gets the first one's sit. */
    requestKey: text().notNull(),
    /** Raised by each change; the calendar's SEQUENCE. */
    sequence: integer().notNull().default(0),
    bookedBy: text().notNull(),
    createdAt: integer().notNull(),
    updatedAt: integer().notNull(),
  },
  (t) => [
    uniqueIndex('sits_once_a_request').on(t.clubId, t.requestKey),
    index('sits_by_day').on(t.clubId, t.day),
    index('sits_by_member').on(t.memberId, t.day),
    index('sits_by_stand').on(t.standId, t.day),
  ],
);

/** Holds one stand and one member for one window; gone when the sit is cancelled. */
export const claims = sqliteTable(
  'claims',
  {
    id: text().primaryKey(),
    clubId: text().notNull(),
    sitId: text()
      .notNull()
      .references(() => sits.id),
    standId: text().notNull(),
    memberId: text().notNull(),
    day: text().notNull(),
    window: text({ enum: WINDOW_NAMES }).notNull(),
  },
  (t) => [
    uniqueIndex('claims_stand_once').on(t.standId, t.day, t.window),
    uniqueIndex('claims_member_once').on(t.memberId, t.day, t.window),
    index('claims_by_sit').on(t.sitId),
  ],
);

/** What was seen in a sit. */
export const sitLogs = sqliteTable('sit_logs', {
  sitId: text()
    .primaryKey()
    .references(() => sits.id),
  clubId: text().notNull(),
  startAt: integer().notNull(),
  endAt: integer().notNull(),
  antleredBucks: integer().notNull(),
  does: integer().notNull(),
  fawns: integer().notNull(),
  unknown: integer().notNull(),
  /** Deer bumped on the way in, while sitting and on the way out. */
  bumpedIn: integer().notNull(),
  bumpedSitting: integer().notNull(),
  bumpedOut: integer().notNull(),
  notes: text().notNull().default(''),
  createdAt: integer().notNull(),
  bumpedWhere: text().notNull().default(''),
  shot: text({ enum: SHOTS }).notNull().default('none'),
  shotAt: integer(),
  /** Of a hit: where, as far as the hunter could tell. */
  hitPlace: text({ enum: HIT_PLACES }),
  followUp: text({ enum: FOLLOW_UPS }),
  followUpNotes: text().notNull().default(''),
  /** Raised by each save; what it was before stands in sit_log_versions. */
  version: integer().notNull().default(1),
  /** Membership of who saved it last; null: the member whose sit it is. */
  savedBy: text(),
  /** null: never changed since it was written. */
  updatedAt: integer(),
});

/** A secret calendar address. Only a hash of its secret is kept. */
export const calendarFeeds = sqliteTable(
  'calendar_feeds',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    memberId: text()
      .notNull()
      .references(() => memberships.id),
    scope: text({ enum: ['own', 'club'] }).notNull(),
    /** Whether entries carry the stand's position. */
    withPlace: integer({ mode: 'boolean' }).notNull(),
    secretHash: text().notNull().unique(),
    createdAt: integer().notNull(),
    revokedAt: integer(),
  },
  (t) => [index('calendar_feeds_by_member').on(t.memberId)],
);
