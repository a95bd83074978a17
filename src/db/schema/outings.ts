import { sql } from 'drizzle-orm';
import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { users } from './accounts';
import { sits } from './bookings';
import { clubs, memberships } from './clubs';
import { approaches, parkings } from './ground';

const clubId = () =>
  text()
    .notNull()
    .references(() => clubs.id);

/** One time on the ground for a sit, from signing in to signing out. A sit may have several, one open at a time. */
export const outings = sqliteTable(
  'outings',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    sitId: text()
      .notNull()
      .references(() => sits.id),
    memberId: text()
      .notNull()
      .references(() => memberships.id),
    approachId: text().references(() => approaches.id),
    parkingId: text().references(() => parkings.id),
    vehicle: text().notNull().default(''),
    signedInAt: integer().notNull(),
    signedInBy: text().notNull(),
    backBy: integer().notNull(),
    /** As it was said first; never changed. */
    firstBackBy: integer().notNull(),
    /** Raised by each move of the back-by time: the overdue steps then start anew. */
    moves: integer().notNull().default(0),
    /** The latest move was for a deer being tracked. */
    tracking: integer({ mode: 'boolean' }).notNull().default(false),
    /** The last word from the person: signing in or moving the back-by. */
    lastSignAt: integer().notNull(),
    /** The safety contact is not to be told this time. */
    contactOff: integer({ mode: 'boolean' }).notNull().default(false),
    signedOutAt: integer(),
    signedOutBy: text(),
  },
  (t) => [
    uniqueIndex('outings_one_open_a_sit').on(t.sitId).where(sql`signed_out_at is null`),
    uniqueIndex('outings_one_open_a_member').on(t.memberId).where(sql`signed_out_at is null`),
    index('outings_by_sit').on(t.sitId),
    index('outings_open').on(t.signedOutAt, t.backBy),
    index('outings_by_club').on(t.clubId, t.signedInAt),
  ],
);

export const OVERDUE_STEPS = ['member', 'officers', 'contact'] as const;
export const STEP_OUTCOMES = ['mailed', 'nobody', 'no_consent', 'off'] as const;

/** One row a step and back-by time: whatever the number of processes, a step is taken once. */
export const overdueSteps = sqliteTable(
  'overdue_steps',
  {
    /** outing:moves:step */
    id: text().primaryKey(),
    clubId: clubId(),
    outingId: text()
      .notNull()
      .references(() => outings.id),
    step: text({ enum: OVERDUE_STEPS }).notNull(),
    moves: integer().notNull(),
    outcome: text({ enum: STEP_OUTCOMES }).notNull(),
    at: integer().notNull(),
  },
  (t) => [index('overdue_steps_by_outing').on(t.outingId)],
);

/** Whom to tell when a person is overdue. One for each account; counts only once that person has said yes. */
export const safetyContacts = sqliteTable('safety_contacts', {
  userId: text()
    .primaryKey()
    .references(() => users.id),
  name: text().notNull(),
  email: text().notNull(),
  /** Of the mailed link with which the contact answers. */
  secretHash: text().notNull().unique(),
  askedAt: integer().notNull(),
  expiresAt: integer().notNull(),
  consentedAt: integer(),
  declinedAt: integer(),
  /** The member's own switch. */
  off: integer({ mode: 'boolean' }).notNull().default(false),
});

/** A secret address of a page for one outing alone. Only a hash of its secret is kept. */
export const sitLinks = sqliteTable(
  'sit_links',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    outingId: text()
      .notNull()
      .references(() => outings.id),
    /** 'contact': mailed when overdue; 'shared': made by the member for somebody at home. */
    kind: text({ enum: ['contact', 'shared'] }).notNull(),
    secretHash: text().notNull().unique(),
    createdAt: integer().notNull(),
    expiresAt: integer().notNull(),
    revokedAt: integer(),
  },
  (t) => [index('sit_links_by_outing').on(t.outingId)],
);
