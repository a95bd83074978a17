import { index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { Geometry, Position } from 'geojson';
import { PRESSURE_KINDS } from '@/core/condition-types';
import {
  FEATURE_KINDS,
  type GoodWindArc,
  SHELTER_CLASSES,
  STAND_KINDS,
  SUITABILITIES,
  type UseTable,
  type Weapon,
} from '@/core/ground-types';
import type { CropYear } from '@/core/map-layers';
import { clubs } from './clubs';

const clubId = () =>
  text()
    .notNull()
    .references(() => clubs.id);

export const parkings = sqliteTable(
  'parkings',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    name: text().notNull(),
    lat: real().notNull(),
    lon: real().notNull(),
    notes: text().notNull().default(''),
    version: integer().notNull().default(1),
    removedAt: integer(),
  },
  (t) => [index('parkings_by_club').on(t.clubId)],
);

export const stands = sqliteTable(
  'stands',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    name: text().notNull(),
    kind: text({ enum: STAND_KINDS }).notNull(),
    lat: real().notNull(),
    lon: real().notNull(),
    seatHeightM: real().notNull(),
    facingDeg: real(),
    shotSide: text({ enum: ['left', 'right', 'either'] }).notNull(),
    /** Longest shot in metres for each weapon allowed here. */
    shotRangeM: text({ mode: 'json' }).$type<Partial<Record<Weapon, number>>>().notNull(),
    shelter: text({ enum: SHELTER_CLASSES }).notNull(),
    seats: integer().notNull(),
    arcs: text({ mode: 'json' }).$type<GoodWindArc[]>().notNull(),
    morning: text({ enum: SUITABILITIES }).notNull(),
    evening: text({ enum: SUITABILITIES }).notNull(),
    /** null: the club's default. */
    restDays: integer(),
    mostSitsSeason: integer(),
    drainBearingDeg: real(),
    slopePercent: real(),
    /** Memberships that may hunt it; null: everyone. */
    allowedMemberIds: text({ mode: 'json' }).$type<string[]>(),
    notes: text().notNull().default(''),
    version: integer().notNull().default(1),
    createdAt: integer().notNull(),
    removedAt: integer(),
  },
  (t) => [index('stands_by_club').on(t.clubId)],
);

/** Days on which a stand, or with no stand the whole club's ground, is closed. */
export const closures = sqliteTable(
  'closures',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    standId: text().references(() => stands.id),
    fromDay: text().notNull(),
    /** null: until opened again. */
    toDay: text(),
    reason: text().notNull(),
    byMemberId: text().notNull(),
    createdAt: integer().notNull(),
    removedAt: integer(),
  },
  (t) => [index('closures_by_club').on(t.clubId)],
);

export const approaches = sqliteTable(
  'approaches',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    standId: text()
      .notNull()
      .references(() => stands.id),
    parkingId: text().references(() => parkings.id),
    name: text().notNull(),
    direction: text({ enum: ['in', 'out', 'both'] }).notNull(),
    /** [lon, lat] from the parking place to the stand. */
    points: text({ mode: 'json' }).$type<Position[]>().notNull(),
    /** Points up to and including this one are driven. */
    vehicleToIndex: integer().notNull().default(0),
    notes: text().notNull().default(''),
    version: integer().notNull().default(1),
    removedAt: integer(),
  },
  (t) => [index('approaches_by_club').on(t.clubId), index('approaches_by_stand').on(t.standId)],
);

export const features = sqliteTable(
  'features',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    name: text().notNull(),
    kind: text({ enum: FEATURE_KINDS }).notNull(),
    geometry: text({ mode: 'json' }).$type<Geometry>().notNull(),
    months: text({ mode: 'json' }).$type<number[]>().notNull(),
    use: text({ mode: 'json' }).$type<Partial<UseTable>>(),
    /** What a crop field holds by year; its months then stand in place of the feature's own. */
    rotation: text({ mode: 'json' }).$type<CropYear[]>().notNull().default([]),
    notes: text().notNull().default(''),
    version: integer().notNull().default(1),
    removedAt: integer(),
  },
  (t) => [index('features_by_club').on(t.clubId)],
);

/** People on the ground for anything but a sit. */
export const visits = sqliteTable(
  'visits',
  {
    id: text().primaryKey(),
    clubId: clubId(),
    kind: text({ enum: PRESSURE_KINDS }).notNull(),
    at: integer().notNull(),
    lat: real().notNull(),
    lon: real().notNull(),
    standId: text().references(() => stands.id),
    memberId: text().notNull(),
    bumped: integer().notNull().default(0),
    notes: text().notNull().default(''),
    createdAt: integer().notNull(),
    removedAt: integer(),
  },
  (t) => [index('visits_by_club').on(t.clubId, t.at)],
);
