import { integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** Heights of the ground as the elevation service gave them, ten by ten posts of three arc seconds to a tile. */
export const elevationTiles = sqliteTable(
  'elevation_tiles',
  {
    /** Service the heights are by: heights of another are never mixed in. */
    source: text().notNull(),
    /** South-west corner in tiles of 10 posts, from latitude and longitude 0. */
    row: integer().notNull(),
    column: integer().notNull(),
    /** Metres above the sea, row by row from the south-west. */
    heights: text({ mode: 'json' }).$type<number[]>().notNull(),
    fetchedAt: integer().notNull(),
  },
  (t) => [primaryKey({ columns: [t.source, t.row, t.column] })],
);
