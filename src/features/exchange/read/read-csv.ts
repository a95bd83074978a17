import Papa from 'papaparse';
import { parseDegrees } from '@/features/ground/place-text';
import { FILE_PROBLEMS, THING_PROBLEMS } from '../words/files';
import { FileProblem } from './file-problem';
import { LONGEST_LINE, MOST_THINGS } from './limits';
import type { RawFile, RawThing } from './raw-thing';

const COLUMNS = {
  lat: ['lat', 'latitude', 'y', 'lat_dd', 'latitude (deg)'],
  lon: ['lon', 'lng', 'long', 'longitude', 'x', 'lon_dd', 'longitude (deg)'],
  name: ['name', 'title', 'label', 'id', 'waypoint'],
  kind: ['kind', 'type', 'category', 'symbol', 'sym', 'icon'],
  notes: ['notes', 'note', 'desc', 'description', 'comment', 'cmt'],
} as const;
type Column = keyof typeof COLUMNS;

function findColumns(header: string[]): Partial<Record<Column, number>> {
  const tidy = header.map((cell) => cell.trim().toLowerCase());
  const found: Partial<Record<Column, number>> = {};
  for (const column of ['lat', 'lon', 'name', 'kind', 'notes'] as const) {
    const at = COLUMNS[column].map((name) => tidy.indexOf(name)).find((i) => i >= 0);
    if (at !== undefined) found[column] = at;
  }
  return found;
}

function refuseLongLines(text: string): void {
  let start = 0;
  for (let line = 1; start <= text.length; line++) {
    const end = text.indexOf('\n', start);
    const length = (end < 0 ? text.length : end) - start;
    if (length > LONGEST_LINE) {
      throw new FileProblem(FILE_PROBLEMS.longLine(line, length, LONGEST_LINE));
    }
    if (end < 0) return;
    start = end + 1;
  }
}

/** An apostrophe before what a spreadsheet would take for a formula is the writer's, not the name's. */
const plain = (cell: string | undefined) => (cell ?? '').trim().replace(/^'(?=[=+\-@])/, '');

function readRow(cells: string[], at: Partial<Record<Column, number>>, line: number): RawThing {
  const cell = (column: Column) => plain(cells[at[column] ?? -1]);
  const said = { name: cell('name'), notes: cell('notes'), told: cell('kind') };
  const [lat, lon] = [cell('lat'), cell('lon')];
  // Bounds are looked at later, where swapped numbers can be told from wrong ones.
  const [north, east] = [
    parseDegrees(lat, 'lon') ?? parseDegrees(lat, 'lat'),
    parseDegrees(lon, 'lon') ?? parseDegrees(lon, 'lat'),
  ];
  if (north === null || east === null) {
    const problem =
      north === null
        ? THING_PROBLEMS.noLatitude(line, lat.slice(0, 30))
        : THING_PROBLEMS.noLongitude(line, lon.slice(0, 30));
    return { ...said, geometry: null, problem };
  }
  return { ...said, geometry: { type: 'Point', coordinates: [east, north] } };
}

function countLines(text: string, from: number, to: number): number {
  let count = 0;
  for (let i = text.indexOf('\n', from); i >= 0 && i < to; i = text.indexOf('\n', i + 1)) count += 1;
  return count;
}

/** A table of points with a row of headings; comma, semicolon or tab. */
export function readCsv(text: string): RawFile {
  refuseLongLines(text);
  const things: RawThing[] = [];
  let columns: Partial<Record<Column, number>> | null = null;
  let line = 1;
  let cursor = 0;
  let problem: string | null = null;
  Papa.parse<string[]>(text.trimEnd(), {
    delimitersToGuess: [',', ';', '\t', '|'],
    step: ({ data, errors, meta }, parser) => {
      const begins = line;
      line += countLines(text, cursor, meta.cursor);
      cursor = meta.cursor;
      if (data.every((cell) => cell.trim() === '')) return;
      if (errors.some(({ type }) => type === 'Quotes')) problem = FILE_PROBLEMS.openQuote(begins);
      if (!columns) {
        columns = findColumns(data);
        if (columns.lat === undefined || columns.lon === undefined) {
          problem = FILE_PROBLEMS.noHeadings(begins);
        }
      } else if (things.length >= MOST_THINGS) {
        problem = FILE_PROBLEMS.rows(MOST_THINGS);
      } else {
        things.push(readRow(data, columns, begins));
      }
      if (problem) parser.abort();
    },
  });
  if (problem) throw new FileProblem(problem);
  return { things, remarks: [] };
}
