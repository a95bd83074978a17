import type * as schema from '@/db/schema';

/** The demo as rows, in the order in which they may be written. */
export interface DemoRows {
  users: (typeof schema.users.$inferInsert)[];
  clubs: (typeof schema.clubs.$inferInsert)[];
  memberships: (typeof schema.memberships.$inferInsert)[];
  parkings: (typeof schema.parkings.$inferInsert)[];
  stands: (typeof schema.stands.$inferInsert)[];
  closures: (typeof schema.closures.$inferInsert)[];
  approaches: (typeof schema.approaches.$inferInsert)[];
  features: (typeof schema.features.$inferInsert)[];
  mapItems: (typeof schema.mapItems.$inferInsert)[];
  imports: (typeof schema.imports.$inferInsert)[];
  sits: (typeof schema.sits.$inferInsert)[];
  claims: (typeof schema.claims.$inferInsert)[];
  outings: (typeof schema.outings.$inferInsert)[];
  safetyContacts: (typeof schema.safetyContacts.$inferInsert)[];
  sitLogs: (typeof schema.sitLogs.$inferInsert)[];
  sitPredictions: (typeof schema.sitPredictions.$inferInsert)[];
  sitLogVersions: (typeof schema.sitLogVersions.$inferInsert)[];
  harvests: (typeof schema.harvests.$inferInsert)[];
  visits: (typeof schema.visits.$inferInsert)[];
  chores: (typeof schema.chores.$inferInsert)[];
  setupAnswers: (typeof schema.setupAnswers.$inferInsert)[];
  inspections: (typeof schema.inspections.$inferInsert)[];
  draws: (typeof schema.draws.$inferInsert)[];
  drawEntries: (typeof schema.drawEntries.$inferInsert)[];
  workDays: (typeof schema.workDays.$inferInsert)[];
  workDayMembers: (typeof schema.workDayMembers.$inferInsert)[];
  auditLog: (typeof schema.auditLog.$inferInsert)[];
}
