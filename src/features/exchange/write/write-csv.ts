import { csvCell } from '@/lib/csv';
import { degrees, type ExportedMap, plain } from './exported';

/** The points as a table; lines and areas have no place in one. Degrees stand as bare numbers, minus and all. */
export function writeCsv({ things }: ExportedMap): string {
  const rows = things.flatMap(({ geometry, name, kind, notes }) => {
    if (geometry.type !== 'Point') return [];
    const [lon, lat] = geometry.coordinates;
    return [[csvCell(plain(name)), csvCell(kind), degrees(lat), degrees(lon), csvCell(plain(notes))].join(',')];
  });
  return `\ufeff${['name,kind,lat,lon,notes', ...rows].join('\r\n')}\r\n`;
}
