import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { clubs } from './clubs';

/** The first steps of a new club, put away by one of its admins. */
export const clubStarts = sqliteTable('club_starts', {
  clubId: text()
    .primaryKey()
    .references(() => clubs.id),
  /** Membership of who put them away. */
  hiddenBy: text().notNull(),
  hiddenAt: integer().notNull(),
});

/** Ground laid as a sample, so that it can be taken away as one. */
export const sampleThings = sqliteTable(
  'sample_things',
  {
    /** Of the stand or parking place. */
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    kind: text({ enum: ['stand', 'parking'] }).notNull(),
  },
  (t) => [index('sample_things_by_club').on(t.clubId)],
);
