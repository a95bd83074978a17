import { index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { NOTICE_KINDS } from '@/core/notices/notice-kinds';
import { sits } from './bookings';
import { clubs, memberships } from './clubs';

/** What one member wants to be told. No row: the defaults of core/notices. */
export const noticeChoices = sqliteTable('notice_choices', {
  memberId: text()
    .primaryKey()
    .references(() => memberships.id),
  clubId: text()
    .notNull()
    .references(() => clubs.id),
  kinds: text({ mode: 'json' }).$type<(typeof NOTICE_KINDS)[number][]>().notNull(),
  /** Points of quiet a booked sit must lose before its member is told. */
  windPoints: integer().notNull(),
  /** The club's clock, 24 h. Equal: no quiet hours. */
  quietFrom: text().notNull(),
  quietTo: text().notNull(),
  updatedAt: integer().notNull(),
});

/** The address in a mail that stops its kind. Only a hash of its secret is kept. */
export const noticeLinks = sqliteTable('notice_links', {
  secretHash: text().primaryKey(),
  clubId: text()
    .notNull()
    .references(() => clubs.id),
  memberId: text()
    .notNull()
    .references(() => memberships.id),
  kind: text({ enum: NOTICE_KINDS }).notNull(),
  createdAt: integer().notNull(),
});

/** What was thought of a booked sit when it was booked or its member was last told. */
export const sitOutlooks = sqliteTable(
  'sit_outlooks',
  {
    sitId: text()
      .primaryKey()
      .references(() => sits.id),
    clubId: text().notNull(),
    /** Stand, day and window it was thought of: a sit that is moved is looked at anew. */
    about: text().notNull(),
    quiet: real().notNull(),
    /** Share of the sit with the wind in the good arcs; null: no forecast reached it. */
    hold: real(),
    /** Mean wind, degrees true; null: none. */
    windFromDeg: real(),
    /** Of the forecast last looked at; null: none. */
    forecastAt: integer(),
    /** Times the member was told. */
    told: integer().notNull().default(0),
    updatedAt: integer().notNull(),
  },
  (t) => [index('sit_outlooks_by_club').on(t.clubId)],
);
