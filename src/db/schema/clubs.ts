import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { ClubRules } from '@/core/booking/rules';
import { ROLES } from '@/core/permissions';
import { users } from './accounts';

export const clubs = sqliteTable('clubs', {
  id: text().primaryKey(),
  slug: text().notNull().unique(),
  name: text().notNull(),
  lat: real().notNull(),
  lon: real().notNull(),
  /** IANA zone name. */
  zone: text().notNull(),
  units: text({ enum: ['us', 'metric'] }).notNull(),
  rules: text({ mode: 'json' }).$type<ClubRules>().notNull(),
  /** Raised by each save, so two admins cannot overwrite each other unseen. */
  version: integer().notNull().default(1),
  createdAt: integer().notNull(),
});

export const memberships = sqliteTable(
  'memberships',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    userId: text()
      .notNull()
      .references(() => users.id),
    role: text({ enum: ROLES }).notNull(),
    /** Guests only: the membership of the member who answers for them. */
    sponsorId: text(),
    /** Guests only: first and last day they may sit. */
    guestFrom: text(),
    guestTo: text(),
    joinedAt: integer().notNull(),
    removedAt: integer(),
  },
  (t) => [uniqueIndex('memberships_one_a_club').on(t.clubId, t.userId), index('memberships_by_user').on(t.userId)],
);

export const invitations = sqliteTable(
  'invitations',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    email: text().notNull(),
    name: text().notNull(),
    role: text({ enum: ROLES }).notNull(),
    sponsorId: text(),
    guestFrom: text(),
    guestTo: text(),
    tokenHash: text().notNull().unique(),
    invitedBy: text().notNull(),
    createdAt: integer().notNull(),
    sentAt: integer().notNull(),
    expiresAt: integer().notNull(),
    acceptedAt: integer(),
    revokedAt: integer(),
  },
  (t) => [index('invitations_by_club').on(t.clubId)],
);
