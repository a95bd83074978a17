import { index, integer, primaryKey, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { INSPECTION_RESULTS, type InspectionAnswers } from '@/core/upkeep/inspection';
import { clubs, memberships } from './clubs';
import { closures, stands } from './ground';

const clubId = () =>
  text()
    .notNull()
    .references(() => clubs.id);

/** Work a club wants done. */
export const chores = sqliteTable(
  'chores',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    title: text().notNull(),
    notes: text().notNull().default(''),
    /** null: whoever takes it. */
    assigneeId: text().references(() => memberships.id),
    /** Name of the place when it was set; '' : no one place. */
    placeName: text().notNull().default(''),
    /** 'stand:ID', 'parking:ID', 'feature:ID' or 'point'. */
    place: text().notNull().default(''),
    lat: real(),
    lon: real(),
    /** YYYY-MM-DD; null: no hurry. */
    dueOn: text(),
    createdBy: text().notNull(),
    createdAt: integer().notNull(),
    /** Day on which it was done; null: still to do. */
    doneOn: text(),
    doneBy: text().references(() => memberships.id),
    /** Credited to whoever did it. */
    hours: real(),
    version: integer().notNull().default(1),
    removedAt: integer(),
  },
  (t) => [index('chores_by_club').on(t.clubId, t.doneOn)],
);

/** One look over a stand. Never changed: the next one stands beside it. */
export const inspections = sqliteTable(
  'inspections',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    standId: text()
      .notNull()
      .references(() => stands.id),
    byMemberId: text()
      .notNull()
      .references(() => memberships.id),
    /** YYYY-MM-DD in the club's zone. */
    day: text().notNull(),
    result: text({ enum: INSPECTION_RESULTS }).notNull(),
    answers: text({ mode: 'json' }).$type<InspectionAnswers>().notNull(),
    notes: text().notNull().default(''),
    /** Day on which the main strap was fitted; null: none, or not known. */
    strapFittedOn: text(),
    /** How long its maker lets it serve; null: not said. */
    strapYears: real(),
    nextDueOn: text().notNull(),
    /** Of the closure it made. */
    closureId: text().references(() => closures.id),
    createdAt: integer().notNull(),
  },
  (t) => [index('inspections_by_stand').on(t.standId, t.day), index('inspections_by_club').on(t.clubId, t.day)],
);

/** A day on which the club works together. */
export const workDays = sqliteTable(
  'work_days',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    title: text().notNull(),
    day: text().notNull(),
    startAt: integer().notNull(),
    endAt: integer().notNull(),
    /** Where to meet. */
    meet: text().notNull().default(''),
    notes: text().notNull().default(''),
    /** Raised by each change; the calendar's SEQUENCE. */
    sequence: integer().notNull().default(0),
    cancelledAt: integer(),
    createdAt: integer().notNull(),
    updatedAt: integer().notNull(),
  },
  (t) => [index('work_days_by_club').on(t.clubId, t.day)],
);

/** Who comes, and afterwards the hours credited. */
export const workDayMembers = sqliteTable(
  'work_day_members',
  {
    clubId: clubId(),
    workDayId: text()
      .notNull()
      .references(() => workDays.id),
    memberId: text()
      .notNull()
      .references(() => memberships.id),
    /** null: said to come, not credited yet. */
    hours: real(),
    at: integer().notNull(),
  },
  (t) => [primaryKey({ columns: [t.workDayId, t.memberId] }), index('work_day_members_by_club').on(t.clubId)],
);
