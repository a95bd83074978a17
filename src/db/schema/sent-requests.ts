import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { clubs } from './clubs';

/** What a browser has sent under a key of its own: sent again, after a lost answer, it changes nothing. */
export const sentRequests = sqliteTable(
  'sent_requests',
  {
    /** membership:key */
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    kind: text().notNull(),
    /** What the first sending made or changed. */
    subjectId: text().notNull(),
    at: integer().notNull(),
  },
  (t) => [index('sent_requests_by_time').on(t.at)],
);
