import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { PointRules } from '@/core/draw/points';
import { WEAPONS, WINDOW_NAMES } from '@/core/types';
import { sits } from './bookings';
import { clubs, memberships } from './clubs';
import { stands } from './ground';

export const DRAW_STATES = ['open', 'drawn', 'published', 'cancelled'] as const;

/** What the sums found: total worth, what no answer can be above, and how far apart they may be as a share. */
export interface DrawResult {
  value: number;
  bound: number;
  gap: number;
  timeUp: boolean;
}

/** A fair allotment of stands for one busy day. */
export const draws = sqliteTable(
  'draws',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    /** YYYY-MM-DD in the club's zone. */
    day: text().notNull(),
    windows: text({ enum: [...WINDOW_NAMES, 'all_day'] }).notNull(),
    standIds: text({ mode: 'json' }).$type<string[]>().notNull(),
    closesAt: integer().notNull(),
    pointRules: text({ mode: 'json' }).$type<PointRules>().notNull(),
    /** Makes the order of turns; set when the draw is opened and shown to all. */
    seed: text().notNull(),
    note: text().notNull().default(''),
    state: text({ enum: DRAW_STATES }).notNull(),
    result: text({ mode: 'json' }).$type<DrawResult>(),
    createdBy: text().notNull(),
    createdAt: integer().notNull(),
    drawnAt: integer(),
    publishedAt: integer(),
  },
  (t) => [index('draws_by_club').on(t.clubId, t.day)],
);

/** One member's wishes, and what came of them. */
export const drawEntries = sqliteTable(
  'draw_entries',
  {
    drawId: text()
      .notNull()
      .references(() => draws.id),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    memberId: text()
      .notNull()
      .references(() => memberships.id),
    weapon: text({ enum: WEAPONS }).notNull(),
    /** Stands, the most wanted first. */
    choices: text({ mode: 'json' }).$type<string[]>().notNull(),
    anyByScore: integer({ mode: 'boolean' }).notNull(),
    at: integer().notNull(),
    points: integer(),
    /** Place in line, from 1. */
    turn: integer(),
    standId: text().references(() => stands.id),
    /** What came of each choice, in plain sentences. */
    reasons: text({ mode: 'json' }).$type<string[]>(),
    sitId: text().references(() => sits.id),
    /** The member to whom a swap of stands is offered. */
    swapWith: text().references(() => memberships.id),
  },
  (t) => [primaryKey({ columns: [t.drawId, t.memberId] }), index('draw_entries_by_club').on(t.clubId, t.memberId)],
);
