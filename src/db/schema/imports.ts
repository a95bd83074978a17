import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { LineString, Point, Polygon } from 'geojson';
import { clubs } from './clubs';

/** One thing of a file as it was read; a problem says why it cannot be taken. */
export interface ImportedThing {
  name: string;
  notes: string;
  /** What the file calls it, for guessing its kind. */
  told: string;
  geometry: Point | LineString | Polygon | null;
  problem: string | null;
  /** What was changed in reading it. */
  remarks: string[];
}

export interface MadeThing {
  kind: 'stand' | 'parking' | 'approach' | 'feature' | 'item';
  id: string;
  name: string;
}

/** Files read for the ground: kept while somebody looks them over, and what came of them for undoing. */
export const imports = sqliteTable(
  'imports',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    memberId: text().notNull(),
    fileName: text().notNull(),
    format: text({ enum: ['gpx', 'kml', 'kmz', 'geojson', 'csv'] }).notNull(),
    state: text({ enum: ['read', 'saved', 'undone'] }).notNull(),
    things: text({ mode: 'json' }).$type<ImportedThing[]>().notNull(),
    /** What was odd about the file as a whole. */
    remarks: text({ mode: 'json' }).$type<string[]>().notNull(),
    /** Latitude and longitude are taken the other way round. */
    swapped: integer({ mode: 'boolean' }).notNull().default(false),
    made: text({ mode: 'json' }).$type<MadeThing[]>().notNull().default([]),
    version: integer().notNull().default(1),
    createdAt: integer().notNull(),
    savedAt: integer(),
    undoneAt: integer(),
  },
  (t) => [index('imports_by_club').on(t.clubId, t.createdAt)],
);
