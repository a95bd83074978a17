import { integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { type sitLogs, sits } from './bookings';

/** A log as it stood before a change. */
export type SitLogSnapshot = Omit<typeof sitLogs.$inferSelect, 'sitId' | 'clubId' | 'createdAt'>;

/** What a log said before each change: nothing that was once written down is lost. */
export const sitLogVersions = sqliteTable(
  'sit_log_versions',
  {
    id: text().primaryKey(),
    clubId: text().notNull(),
    sitId: text()
      .notNull()
      .references(() => sits.id),
    version: integer().notNull(),
    /** Membership of who had saved it so. */
    savedBy: text().notNull(),
    savedAt: integer().notNull(),
    log: text({ mode: 'json' }).$type<SitLogSnapshot>().notNull(),
  },
  (t) => [uniqueIndex('sit_log_versions_once').on(t.sitId, t.version)],
);
