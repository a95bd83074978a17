import type { ElevationPort } from '@/adapters/elevation/port';
import type { HeightGrid } from '@/core/terrain/height-grid';
import { write } from '@/db/client';
import { keepTiles, listTiles } from './data';
import { type Bounds, joinTiles, keyOf, postsOf, spanOf, type TileAt, tilesOf } from './tiles';
import { HEIGHT_ERRORS } from './words';

/** Requests under way at once, and in all for one answer. */
const AT_ONCE = 4;
export const MOST_TILES = 64;

export type Loaded = { ok: true; grid: HeightGrid; label: string } | { ok: false; message: string };

interface Fetched {
  tiles: (TileAt & { heights: number[] })[];
  problem: string | null;
}

async function fetchTiles(port: ElevationPort, missing: TileAt[]): Promise<Fetched> {
  const tiles: Fetched['tiles'] = [];
  let problem: string | null = null;
  for (let from = 0; from < missing.length && problem === null; from += AT_ONCE) {
    const answers = await Promise.all(
      missing.slice(from, from + AT_ONCE).map(async (at) => ({ at, answer: await port.heights(postsOf(at)) })),
    );
    for (const { at, answer } of answers) {
      if (answer.ok) tiles.push({ ...at, heights: answer.heightsM });
      else problem ??= answer.message;
    }
  }
  return { tiles, problem };
}

/** Heights of a rectangle: what is kept already, and the rest asked for once and kept for good. */
export async function loadHeights(port: ElevationPort, bounds: Bounds, now: number): Promise<Loaded> {
  const span = spanOf(bounds);
  const wanted = tilesOf(span);
  if (wanted.length > MOST_TILES) return { ok: false, message: HEIGHT_ERRORS.tooMuch };
  const held = new Map((await listTiles(port.source, span)).map((tile) => [keyOf(tile), tile.heights]));
  const missing = wanted.filter((at) => !held.has(keyOf(at)));
  if (missing.length > 0) {
    const { tiles, problem } = await fetchTiles(port, missing);
    if (tiles.length > 0) await write((tx) => keepTiles(tx, port.source, tiles, now));
    if (problem !== null) return { ok: false, message: problem };
    for (const tile of tiles) held.set(keyOf(tile), tile.heights);
  }
  return { ok: true, grid: joinTiles(span, held), label: port.label };
}
