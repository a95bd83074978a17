import { eq } from 'drizzle-orm';
import type { SQLiteTable } from 'drizzle-orm/sqlite-core';
import type { Reader, Tx } from '@/db/client';
import * as schema from '@/db/schema';
import type { DemoRows } from './demo-rows';

/** So that a statement stays under SQLite's most bound values. */
const ROWS_AT_ONCE = 100;

async function insertAll<T extends SQLiteTable>(tx: Tx, table: T, rows: T['$inferInsert'][]): Promise<void> {
  for (let from = 0; from < rows.length; from += ROWS_AT_ONCE) {
    await tx.insert(table).values(rows.slice(from, from + ROWS_AT_ONCE));
  }
}

export async function insertDemo(tx: Tx, rows: DemoRows): Promise<void> {
  await insertAll(tx, schema.users, rows.users);
  await insertAll(tx, schema.clubs, rows.clubs);
  await insertAll(tx, schema.memberships, rows.memberships);
  await insertAll(tx, schema.parkings, rows.parkings);
  await insertAll(tx, schema.stands, rows.stands);
  await insertAll(tx, schema.closures, rows.closures);
  await insertAll(tx, schema.approaches, rows.approaches);
  await insertAll(tx, schema.features, rows.features);
  await insertAll(tx, schema.mapItems, rows.mapItems);
  await insertAll(tx, schema.imports, rows.imports);
  await insertAll(tx, schema.sits, rows.sits);
  await insertAll(tx, schema.claims, rows.claims);
  await insertAll(tx, schema.outings, rows.outings);
  await insertAll(tx, schema.safetyContacts, rows.safetyContacts);
  await insertAll(tx, schema.sitLogs, rows.sitLogs);
  await insertAll(tx, schema.sitPredictions, rows.sitPredictions);
  await insertAll(tx, schema.sitLogVersions, rows.sitLogVersions);
  await insertAll(tx, schema.harvests, rows.harvests);
  await insertAll(tx, schema.visits, rows.visits);
  await insertAll(tx, schema.chores, rows.chores);
  await insertAll(tx, schema.setupAnswers, rows.setupAnswers);
  await insertAll(tx, schema.inspections, rows.inspections);
  await insertAll(tx, schema.draws, rows.draws);
  await insertAll(tx, schema.drawEntries, rows.drawEntries);
  await insertAll(tx, schema.workDays, rows.workDays);
  await insertAll(tx, schema.workDayMembers, rows.workDayMembers);
  await insertAll(tx, schema.auditLog, rows.auditLog);
}

export async function hasUsersOrClubs(from: Reader | Tx): Promise<boolean> {
  const users = await from.select({ id: schema.users.id }).from(schema.users).limit(1);
  const clubs = await from.select({ id: schema.clubs.id }).from(schema.clubs).limit(1);
  return users.length > 0 || clubs.length > 0;
}

/** The roles of a club's members by their address; empty when there is no such club. */
export async function listSignIns(from: Reader | Tx, slug: string) {
  return from
    .select({
      userId: schema.users.id,
      email: schema.users.email,
      name: schema.users.name,
      role: schema.memberships.role,
    })
    .from(schema.memberships)
    .innerJoin(schema.users, eq(schema.users.id, schema.memberships.userId))
    .innerJoin(schema.clubs, eq(schema.clubs.id, schema.memberships.clubId))
    .where(eq(schema.clubs.slug, slug));
}
