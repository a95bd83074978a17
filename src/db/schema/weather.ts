import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** One row a weather source and place: the last forecast kept, and who may ask for the next one and when. */
export const forecasts = sqliteTable('forecasts', {
  /** source@lat,lon with the place rounded to 0.01 degree: clubs side by side share a row. */
  placeKey: text().primaryKey(),
  issuedAt: integer(),
  fetchedAt: integer(),
  source: text(),
  /** A packed forecast; read through the feature that packs it. */
  body: text({ mode: 'json' }).$type<unknown>(),
  /** No request before this instant, set when a request is claimed. */
  nextFetchAt: integer().notNull(),
  leaseUntil: integer(),
  leaseBy: text(),
  lastTriedAt: integer(),
  lastError: text(),
  /** Requests failed in a row. */
  failures: integer().notNull().default(0),
});
