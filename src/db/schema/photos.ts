import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { clubs } from './clubs';

/** Photos of stands, features and sits; the picture itself lies in the files under the photo's id. */
export const photos = sqliteTable(
  'photos',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    subjectType: text({ enum: ['stand', 'feature', 'sit'] }).notNull(),
    subjectId: text().notNull(),
    caption: text().notNull().default(''),
    width: integer().notNull(),
    height: integer().notNull(),
    bytes: integer().notNull(),
    /** As the camera's own clock says, without a zone: 'YYYY-MM-DD HH:MM'; null: not told or not kept. */
    takenAt: text(),
    byMemberId: text().notNull(),
    createdAt: integer().notNull(),
    removedAt: integer(),
  },
  (t) => [index('photos_by_subject').on(t.clubId, t.subjectType, t.subjectId)],
);
