import { index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { sits } from './bookings';
import { clubs, memberships } from './clubs';
import { stands } from './ground';

/** What the scoring said of a sit when its window began, to be held against its log. Written once. */
export const sitPredictions = sqliteTable(
  'sit_predictions',
  {
    sitId: text()
      .primaryKey()
      .references(() => sits.id),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    standId: text()
      .notNull()
      .references(() => stands.id),
    /** 0-100, with the adjustment that held then. */
    quiet: real().notNull(),
    /** Points of that adjustment; 0: none. */
    adjustedBy: real().notNull().default(0),
    /** Sit score of the same window, 0-100; null: kept before scores were. */
    score: real(),
    /** Mean direction the wind was to come from in it; null: none, or kept before winds were. */
    windFromDeg: real(),
    at: integer().notNull(),
  },
  (t) => [index('sit_predictions_by_club').on(t.clubId, t.at)],
);

/** Points of quiet a stand is held to give more or less than the sums say. Never changed but to be undone. */
export const standAdjustments = sqliteTable(
  'stand_adjustments',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    standId: text()
      .notNull()
      .references(() => stands.id),
    points: real().notNull(),
    /** What it rests on. */
    sits: integer().notNull(),
    lowPoints: real().notNull(),
    highPoints: real().notNull(),
    appliedBy: text()
      .notNull()
      .references(() => memberships.id),
    appliedAt: integer().notNull(),
    endedBy: text().references(() => memberships.id),
    /** Undone, or followed by another; null: it holds. */
    endedAt: integer(),
  },
  (t) => [index('stand_adjustments_by_club').on(t.clubId, t.endedAt)],
);
