import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** Who did what; the database refuses to change or delete a row. */
export const auditLog = sqliteTable(
  'audit_log',
  {
    id: text().primaryKey(),
    clubId: text(),
    at: integer().notNull(),
    actorUserId: text(),
    /** As it was then: a name outlives its account. */
    actorName: text().notNull(),
    /** subject.verb, such as sit.booked. */
    action: text().notNull(),
    subjectType: text().notNull(),
    subjectId: text().notNull(),
    summary: text().notNull(),
    detail: text({ mode: 'json' }).$type<Record<string, unknown>>().notNull(),
  },
  (t) => [index('audit_by_club').on(t.clubId, t.at)],
);

export interface OutboxAttachment {
  filename: string;
  contentType: string;
  content: string;
}

export interface OutboxMessage {
  text: string;
  html: string | null;
  /** An iCalendar part and its method. */
  calendar: { method: 'REQUEST' | 'CANCEL' | 'PUBLISH'; content: string } | null;
  headers: Record<string, string>;
}

export const outbox = sqliteTable(
  'outbox',
  {
    id: text().primaryKey(),
    clubId: text(),
    kind: text().notNull(),
    /** The same event twice gives one mail. */
    dedupeKey: text().notNull().unique(),
    toEmail: text().notNull(),
    toName: text().notNull(),
    subject: text().notNull(),
    /** Emptied once sent: links in it are secrets. */
    message: text({ mode: 'json' }).$type<OutboxMessage>(),
    attempts: integer().notNull().default(0),
    nextAttemptAt: integer().notNull(),
    leaseUntil: integer(),
    createdAt: integer().notNull(),
    sentAt: integer(),
    /** Given up after the last attempt. */
    deadAt: integer(),
    lastError: text(),
  },
  (t) => [index('outbox_due').on(t.sentAt, t.deadAt, t.nextAttemptAt)],
);

/** What the mail fake kept in place of sending. */
export const keptMail = sqliteTable('kept_mail', {
  id: text().primaryKey(),
  messageId: text().notNull(),
  toEmail: text().notNull(),
  subject: text().notNull(),
  text: text().notNull(),
  html: text(),
  calendar: text(),
  at: integer().notNull(),
});

/** One row a job and slot: the same slot runs once whatever the number of processes. */
export const jobRuns = sqliteTable(
  'job_runs',
  {
    /** name@slot */
    id: text().primaryKey(),
    name: text().notNull(),
    slotAt: integer().notNull(),
    leaseUntil: integer(),
    attempts: integer().notNull().default(0),
    startedAt: integer().notNull(),
    finishedAt: integer(),
    error: text(),
    result: text(),
  },
  (t) => [index('job_runs_by_name').on(t.name, t.slotAt)],
);
