import { sql } from 'drizzle-orm';
import { index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { WindowName } from '@/core/condition-types';
import type { PointRules } from '@/core/draw/points';
import { WEAPONS } from '@/core/ground-types';
import { type SitGuest, sits } from './bookings';
import { clubs, memberships } from './clubs';
import { stands } from './ground';

export const DRAW_STATES = ['open', 'drawn', 'published', 'cancelled'] as const;

/** One part of a draw: a window of a day, or all of it. Day: YYYY-MM-DD in the club's zone. */
export interface DrawSlot {
  day: string;
  windows: WindowName | 'all_day';
}

/** What the sums found: total worth, what no answer can be above, and how far apart they may be as a share. */
export interface DrawResult {
  value: number;
  bound: number;
  gap: number;
  /** What ended the sums early; null: nothing. */
  cutBy: 'time' | 'nodes' | null;
}

/** A fair allotment of stands for the busy windows of one day or a few. */
export const draws = sqliteTable(
  'draws',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    /** Day of its first slot. */
    day: text().notNull(),
    /** In the order of time; no two share hours. */
    slots: text({ mode: 'json' }).$type<DrawSlot[]>().notNull().default([]),
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

/** One member's wishes, and what they brought to the draw. */
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
    /** Slots of the draw that are wanted, by their number from 0. */
    slots: text({ mode: 'json' }).$type<number[]>().notNull().default([0]),
    /** Stands, the most wanted first. */
    choices: text({ mode: 'json' }).$type<string[]>().notNull(),
    anyByScore: integer({ mode: 'boolean' }).notNull(),
    /** Who comes along to every sit that is given. */
    guests: text({ mode: 'json' }).$type<SitGuest[]>().notNull().default([]),
    at: integer().notNull(),
    points: integer(),
    /** Place in line, from 1. */
    turn: integer(),
  },
  (t) => [primaryKey({ columns: [t.drawId, t.memberId] }), index('draw_entries_by_club').on(t.clubId, t.memberId)],
);

/** What came of one member's wishes in one slot. */
export const drawResults = sqliteTable(
  'draw_results',
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
    slot: integer().notNull(),
    /** null: none was given. */
    standId: text().references(() => stands.id),
    /** Why, in plain sentences. */
    reasons: text({ mode: 'json' }).$type<string[]>().notNull(),
    sitId: text().references(() => sits.id),
    /** The member to whom a swap of stands is offered. */
    swapWith: text().references(() => memberships.id),
  },
  (t) => [
    primaryKey({ columns: [t.drawId, t.memberId, t.slot] }),
    index('draw_results_by_club').on(t.clubId, t.memberId),
  ],
);

/** The sums at work on a draw, or how they ended. */
export const drawRuns = sqliteTable(
  'draw_runs',
  {
    id: text().primaryKey(),
    drawId: text()
      .notNull()
      .references(() => draws.id),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    startedBy: text().notNull(),
    startedAt: integer().notNull(),
    /** Moved on while the work lives; a run whose lease is over was left by a process that ended. */
    leaseUntil: integer().notNull(),
    /** Worth of the best answer found so far. */
    value: integer(),
    /** No answer can be worth more. */
    bound: integer(),
    endedAt: integer(),
    outcome: text({ enum: ['made', 'stopped', 'failed', 'lost'] }),
    /** Of a failed one: what to do, for people. */
    message: text(),
  },
  (t) => [
    index('draw_runs_by_draw').on(t.drawId, t.startedAt),
    uniqueIndex('draw_runs_one_at_work').on(t.drawId).where(sql`${t.endedAt} is null`),
  ],
);
