import { integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { SetupSettings } from '@/core/setup-check/setup-settings';
import { chores } from './chores';
import { clubs, memberships } from './clubs';

/** What a club answered to a finding of the set-up check. It counts for as long as the print is the same: until the ground changes. */
export const setupAnswers = sqliteTable(
  'setup_answers',
  {
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    findingKey: text().notNull(),
    print: text().notNull(),
    /** As it was told. */
    text: text().notNull(),
    answer: text({ enum: ['chore', 'dismissed'] }).notNull(),
    reason: text().notNull().default(''),
    choreId: text().references(() => chores.id),
    byMemberId: text()
      .notNull()
      .references(() => memberships.id),
    at: integer().notNull(),
  },
  (t) => [primaryKey({ columns: [t.clubId, t.findingKey] })],
);

/** What a club set of the distances and shares of the set-up check in place of the defaults. */
export const setupSettings = sqliteTable('setup_settings', {
  clubId: text()
    .primaryKey()
    .references(() => clubs.id),
  settings: text({ mode: 'json' }).$type<Partial<SetupSettings>>().notNull(),
  /** Raised by each save, so two stewards cannot overwrite each other unseen. */
  version: integer().notNull(),
});
