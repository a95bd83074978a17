import type { Geometry } from 'geojson';

export type FileFormat = 'gpx' | 'kml' | 'kmz' | 'geojson' | 'csv';

/** One thing as a file holds it, before anything is checked. */
export interface RawThing {
  name: string;
  notes: string;
  /** What the file calls it: a kind of our own, a symbol, a type. */
  told: string;
  geometry: Geometry | null;
  /** Found while reading; the thing cannot be taken. */
  problem?: string;
}

export interface RawFile {
  things: RawThing[];
  remarks: string[];
}
