import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { WEAPONS } from '@/core/ground-types';
import { AGE_CLASSES, AGE_METHODS, SEXES } from '@/core/harvest/harvest-types';
import { sits } from './bookings';
import { clubs, memberships } from './clubs';
import { stands } from './ground';

/** One deer taken. Weights in kilograms, lengths in millimetres; null: not written down. */
export const harvests = sqliteTable(
  'harvests',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    /** The member whose count it goes on: of a guest's deer the sponsor. */
    memberId: text()
      .notNull()
      .references(() => memberships.id),
    /** The guest who took it; empty: the member. */
    guestName: text().notNull().default(''),
    /** Set when that guest has an account in the club. */
    guestId: text().references(() => memberships.id),
    sitId: text().references(() => sits.id),
    /** YYYY-MM-DD in the club's zone. */
    day: text().notNull(),
    takenAt: integer().notNull(),
    standId: text().references(() => stands.id),
    /** In words, where it was not at a stand. */
    place: text().notNull().default(''),
    weapon: text({ enum: WEAPONS }).notNull(),
    sex: text({ enum: SEXES }).notNull(),
    antlered: integer({ mode: 'boolean' }).notNull(),
    age: text({ enum: AGE_CLASSES }),
    ageMethod: text({ enum: AGE_METHODS }),
    /** Field dressed; never mixed with live weight. */
    dressedKg: real(),
    liveKg: real(),
    pointsLeft: integer(),
    pointsRight: integer(),
    insideSpreadMm: real(),
    mainBeamLeftMm: real(),
    mainBeamRightMm: real(),
    /** Does only. */
    lactating: integer({ mode: 'boolean' }),
    notes: text().notNull().default(''),
    version: integer().notNull().default(1),
    writtenBy: text().notNull(),
    /** One value for one press of the button: a second arrival gets the first one's sheet. */
    requestKey: text().notNull(),
    createdAt: integer().notNull(),
    removedAt: integer(),
  },
  (t) => [
    uniqueIndex('harvests_once_a_request').on(t.clubId, t.requestKey),
    index('harvests_by_club').on(t.clubId, t.day),
    index('harvests_by_member').on(t.memberId, t.day),
  ],
);
