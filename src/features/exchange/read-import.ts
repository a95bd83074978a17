import { listMapItems, loadGround } from '@/features/ground/data';
import { shapeThings } from '@/features/map/shape-things';
import type { MapClub, MapThing } from '@/features/map/thing';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { getImport, type ImportRow } from './imports-data';
import { checkRow, type ReviewRow, reviewThings } from './review';

export interface ImportView {
  id: string;
  version: number;
  fileName: string;
  state: ImportRow['state'];
  remarks: string[];
  swapped: boolean;
  /** The other way round more of the rows would lie on the club's ground. */
  looksSwapped: boolean;
  rows: ReviewRow[];
  made: ImportRow['made'];
}

async function mapThings(scope: ClubScope): Promise<MapThing[]> {
  const [rows, items] = [await loadGround(scope), await listMapItems(scope)];
  return shapeThings(rows, items, { today: '', cropYear: 0 });
}

export function mapClubOf({ club }: ClubScope): MapClub {
  const { slug, name, lat, lon, units } = club;
  return { slug, name, lat, lon, units };
}

/** Whether the other way round more rows would lie on the club's ground; only those that do not now are tried. */
function looksSwapped(row: ImportRow, rows: ReviewRow[], club: MapClub): boolean {
  const off = rows.filter(({ problem }) => problem !== null);
  const better = off.filter(({ row: number }) => {
    const thing = row.things[number - 1];
    return thing !== undefined && checkRow(thing, !row.swapped, club).ok;
  });
  return better.length > rows.length - off.length;
}

/** One file as it was read, with what would become of every row of it now. */
export async function readImport(scope: ClubScope, id: string): Promise<ImportView> {
  const row = await getImport(scope, id);
  if (!row) throw notFound();
  const club = mapClubOf(scope);
  const open = row.state === 'read';
  const rows = open ? reviewThings(row.things, row.swapped, { club, things: await mapThings(scope) }) : [];
  return {
    id: row.id,
    version: row.version,
    fileName: row.fileName,
    state: row.state,
    remarks: row.remarks,
    swapped: row.swapped,
    looksSwapped: open && looksSwapped(row, rows, club),
    rows,
    made: row.made,
  };
}
