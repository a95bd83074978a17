import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { UNIT_SYSTEMS } from '@/core/units';

export const users = sqliteTable('users', {
  id: text().primaryKey(),
  /** Trimmed and lower case. */
  email: text().notNull().unique(),
  name: text().notNull(),
  passwordHash: text().notNull(),
  emailVerifiedAt: integer(),
  createdAt: integer().notNull(),
  /** How figures are shown to this person in every club; null: as the club has it. */
  units: text({ enum: UNIT_SYSTEMS }),
});

export const sessions = sqliteTable(
  'sessions',
  {
    /** SHA-256 of the value in the cookie. */
    id: text().primaryKey(),
    userId: text()
      .notNull()
      .references(() => users.id),
    /** Seconds: the session library's unit. */
    expiresAt: integer().notNull(),
    createdAt: integer().notNull(),
    userAgent: text().notNull(),
    address: text().notNull(),
  },
  (t) => [index('sessions_by_user').on(t.userId)],
);

export const TOKEN_PURPOSES = ['verify_email', 'reset_password'] as const;

/** Links sent by e-mail: only a hash is kept. */
export const tokens = sqliteTable(
  'tokens',
  {
    id: text().primaryKey(),
    purpose: text({ enum: TOKEN_PURPOSES }).notNull(),
    tokenHash: text().notNull().unique(),
    userId: text()
      .notNull()
      .references(() => users.id),
    createdAt: integer().notNull(),
    expiresAt: integer().notNull(),
    usedAt: integer(),
  },
  (t) => [index('tokens_by_user').on(t.userId, t.purpose)],
);

export const rateLimits = sqliteTable('rate_limits', {
  key: text().primaryKey(),
  windowStartAt: integer().notNull(),
  count: integer().notNull(),
});
