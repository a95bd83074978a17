import { type Indices, indicesOf } from '@/core/indices';
import { countOf, type IndexGroup, monthGroups, standGroups } from '@/features/logs/sightings-reads';
import type { ReportRows } from '../load-rows';

export interface DeerPart {
  total: Indices;
  /** The most deer an hour first. */
  byStand: IndexGroup[];
  byMonth: IndexGroup[];
  /** Sits without a log, of those that count here. */
  unlogged: number;
}

/** Deer an hour, of the sits whose log the reader may see. */
export function readDeer(rows: ReportRows): DeerPart {
  const sits = rows.sits.flatMap((sit) => (sit.log ? [countOf({ ...sit, log: sit.log })] : []));
  return {
    total: indicesOf(sits),
    byStand: standGroups(sits),
    byMonth: monthGroups(sits),
    unlogged: rows.sits.filter(({ hasLog }) => !hasLog).length,
  };
}
