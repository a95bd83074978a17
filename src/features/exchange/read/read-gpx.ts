import { gpx } from '@tmcw/togeojson';
import type { Document, Element } from '@xmldom/xmldom';
import type { Geometry, Position } from 'geojson';
import { FILE_PROBLEMS, THING_PROBLEMS } from '../words/files';
import { isDegrees, lineOf, textOf } from './broken-parts';
import { FileProblem } from './file-problem';
import type { RawFile, RawThing } from './raw-thing';

const POINTS: Record<string, string> = { wpt: 'wpt', rte: 'rtept', trk: 'trkpt' };

function brokenPoint(part: Element, kind: string): Element | null {
  const points = kind === 'wpt' ? [part] : Array.from(part.getElementsByTagName(POINTS[kind] ?? ''));
  return points.find((p) => !isDegrees(p.getAttribute('lat')) || !isDegrees(p.getAttribute('lon'))) ?? null;
}

/** Takes out what the converter would silently leave points out of, and says why. */
function takeBroken(document: Document): RawThing[] {
  const broken: RawThing[] = [];
  for (const kind of Object.keys(POINTS)) {
    for (const part of Array.from(document.getElementsByTagName(kind))) {
      const point = brokenPoint(part, kind);
      if (!point) continue;
      const [lat, lon] = [point.getAttribute('lat'), point.getAttribute('lon')].map(
        (text) => text?.slice(0, 20) ?? null,
      );
      const problem = THING_PROBLEMS.badPoint(lineOf(point), lat ?? null, lon ?? null);
      broken.push({ name: textOf(part, 'name'), notes: '', told: '', geometry: null, problem });
      part.parentNode?.removeChild(part);
    }
  }
  return broken;
}

/** What a receiver writes beside every point and no map here shows; most of a long track is that. Lines stay as they were. */
export function withoutReadings(gpxText: string): { text: string; heights: boolean } {
  const heights = gpxText.includes('<ele>');
  const text = gpxText.replace(/<(ele|time|hdop|vdop|pdop|sat|course|speed|magvar)>[^<]*<\/\1>/g, (found) =>
    found.replace(/[^\n]+/g, ''),
  );
  return { text, heights };
}

const text = (value: unknown): string => (typeof value === 'string' ? value : '');

/** GPX has no areas: a track whose type begins so is the rings of one. */
export const AREA_MARK = 'area';

const closed = (line: Position[]) =>
  line.length >= 4 && line[0]?.[0] === line.at(-1)?.[0] && line[0]?.[1] === line.at(-1)?.[1];

function asArea(geometry: Geometry | null, told: string): Geometry | null {
  if (!told.startsWith(`${AREA_MARK} `)) return geometry;
  const rings =
    geometry?.type === 'LineString'
      ? [geometry.coordinates]
      : geometry?.type === 'MultiLineString'
        ? geometry.coordinates
        : [];
  return rings.length > 0 && rings.every(closed) ? { type: 'Polygon', coordinates: rings } : geometry;
}

/** Waypoints, routes and tracks of GPX 1.1 (and 1.0, which names them alike). */
export function readGpx(document: Document): RawFile {
  if (document.documentElement?.localName !== 'gpx') throw new FileProblem(FILE_PROBLEMS.gpxRoot);
  const broken = takeBroken(document);
  const things = gpx(document).features.map(({ geometry, properties }): RawThing => {
    const { name, desc, cmt, sym, type } = properties ?? {};
    const notes = [text(desc), text(cmt)].filter(Boolean);
    const told = [text(type), text(sym)].filter(Boolean).join(' ');
    return { name: text(name), notes: [...new Set(notes)].join('\n'), told, geometry: asArea(geometry, told) };
  });
  return { things: [...things, ...broken], remarks: [] };
}
