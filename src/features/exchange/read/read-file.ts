import type { ImportedThing } from '@/db/schema';
import { FILE_PROBLEMS, FILE_REMARKS } from '../words/files';
import { decodeText } from './decode-text';
import { detectFormat } from './detect-format';
import { FileProblem } from './file-problem';
import { openKmz } from './open-kmz';
import { parseXml } from './parse-xml';
import type { FileFormat, RawFile } from './raw-thing';
import { readCsv } from './read-csv';
import { readGeoJson } from './read-geojson';
import { readGpx, withoutReadings } from './read-gpx';
import { readKml } from './read-kml';
import { toThings } from './to-things';

export type ReadFile =
  | { ok: true; format: FileFormat; things: ImportedThing[]; remarks: string[] }
  | { ok: false; message: string };

const KINDS = { gpx: 'xml', kml: 'xml', kmz: 'xml', geojson: 'json', csv: 'csv' } as const;

function readAs(format: FileFormat, text: string): RawFile {
  if (format === 'geojson') return readGeoJson(text);
  if (format === 'csv') return readCsv(text);
  if (format !== 'gpx') return readKml(parseXml(text));
  const bare = withoutReadings(text);
  const { things, remarks } = readGpx(parseXml(bare.text));
  return { things, remarks: bare.heights ? [...remarks, FILE_REMARKS.heights] : remarks };
}

/** What a file of a map holds, whatever it is called; or in plain words why it cannot be read. */
export function readMapFile(bytes: Uint8Array): ReadFile {
  try {
    const format = detectFormat(bytes);
    const parts = (format === 'kmz' ? openKmz(bytes) : [bytes]).map((part) => {
      const { text, remarks } = decodeText(part, KINDS[format]);
      const raw = readAs(format, text.replace(/^\ufeff/, ''));
      return { things: raw.things, remarks: [...remarks, ...raw.remarks] };
    });
    const { things, heights } = toThings(parts.flatMap((part) => part.things));
    if (things.length === 0) throw new FileProblem(FILE_PROBLEMS.nothing);
    const all = new Set(parts.flatMap((part) => part.remarks));
    if (heights) all.add(FILE_REMARKS.heights);
    return { ok: true, format, things, remarks: [...all] };
  } catch (error) {
    if (error instanceof FileProblem) return { ok: false, message: error.message };
    throw error;
  }
}
