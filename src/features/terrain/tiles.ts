import type { HeightGrid } from '@/core/terrain/height-grid';

/** Posts stand three seconds of arc apart, as those of the service's own grid do below 50 degrees of latitude. */
export const POSTS_PER_DEGREE = 1200;
/** Posts on a side of a tile: a hundred of them are one request. */
export const TILE = 10;

export interface TileAt {
  row: number;
  column: number;
}

export interface Bounds {
  south: number;
  north: number;
  west: number;
  east: number;
}

/** Whole tiles that hold a rectangle. */
export interface TileSpan {
  fromRow: number;
  toRow: number;
  fromColumn: number;
  toColumn: number;
}

export function spanOf({ south, north, west, east }: Bounds): TileSpan {
  const tile = (degrees: number) => Math.floor((degrees * POSTS_PER_DEGREE) / TILE);
  return { fromRow: tile(south), toRow: tile(north), fromColumn: tile(west), toColumn: tile(east) };
}

export function tilesOf(span: TileSpan): TileAt[] {
  const tiles: TileAt[] = [];
  for (let row = span.fromRow; row <= span.toRow; row++) {
    for (let column = span.fromColumn; column <= span.toColumn; column++) tiles.push({ row, column });
  }
  return tiles;
}

/** The posts of a tile, row by row from the south-west. */
export function postsOf({ row, column }: TileAt): { lat: number; lon: number }[] {
  return Array.from({ length: TILE * TILE }, (_, i) => ({
    lat: (row * TILE + Math.floor(i / TILE)) / POSTS_PER_DEGREE,
    lon: (column * TILE + (i % TILE)) / POSTS_PER_DEGREE,
  }));
}

export const keyOf = ({ row, column }: TileAt) => `${row}:${column}`;

/** Tiles laid together; every tile of the span must be there. */
export function joinTiles(span: TileSpan, tiles: ReadonlyMap<string, number[]>): HeightGrid {
  const rows = (span.toRow - span.fromRow + 1) * TILE;
  const columns = (span.toColumn - span.fromColumn + 1) * TILE;
  const heights = Array.from({ length: rows * columns }, (_, i) => {
    const [y, x] = [Math.floor(i / columns), i % columns];
    const at = { row: span.fromRow + Math.floor(y / TILE), column: span.fromColumn + Math.floor(x / TILE) };
    return tiles.get(keyOf(at))?.[(y % TILE) * TILE + (x % TILE)] ?? Number.NaN;
  });
  return {
    southLat: (span.fromRow * TILE) / POSTS_PER_DEGREE,
    westLon: (span.fromColumn * TILE) / POSTS_PER_DEGREE,
    stepDeg: 1 / POSTS_PER_DEGREE,
    rows,
    columns,
    heights,
  };
}
