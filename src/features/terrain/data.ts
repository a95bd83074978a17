import { and, between, eq } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { elevationTiles } from '@/db/schema';
import type { TileSpan } from './tiles';

/** Heights of the ground are nobody's secret: all clubs share them. */
export function listTiles(source: string, span: TileSpan, from: ReadFrom = reader()) {
  return from
    .select({ row: elevationTiles.row, column: elevationTiles.column, heights: elevationTiles.heights })
    .from(elevationTiles)
    .where(
      and(
        eq(elevationTiles.source, source),
        between(elevationTiles.row, span.fromRow, span.toRow),
        between(elevationTiles.column, span.fromColumn, span.toColumn),
      ),
    );
}

export async function keepTiles(
  tx: Tx,
  source: string,
  tiles: { row: number; column: number; heights: number[] }[],
  now: number,
): Promise<void> {
  for (const tile of tiles) {
    await tx
      .insert(elevationTiles)
      .values({ source, ...tile, fetchedAt: now })
      .onConflictDoNothing();
  }
}
