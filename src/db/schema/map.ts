import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { LineString, Point, Polygon } from 'geojson';
import { MAP_LAYERS, type MapItemProps } from '@/core/map-layers';
import { clubs } from './clubs';

/** Land on the map that is no stand, approach, feature or parking place: boundary, cover, roads, closed areas, cameras. */
export const mapItems = sqliteTable(
  'map_items',
  {
    id: text().primaryKey(),
    clubId: text()
      .notNull()
      .references(() => clubs.id),
    layer: text({ enum: MAP_LAYERS }).notNull(),
    /** May be empty: not every wood has a name. */
    name: text().notNull().default(''),
    geometry: text({ mode: 'json' }).$type<Point | LineString | Polygon>().notNull(),
    props: text({ mode: 'json' }).$type<MapItemProps>().notNull().default({}),
    notes: text().notNull().default(''),
    version: integer().notNull().default(1),
    removedAt: integer(),
  },
  (t) => [index('map_items_by_club').on(t.clubId)],
);
