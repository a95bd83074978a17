import { describe, expect, it } from 'vitest';
import { guessKind } from '../guess-kind';
import { readMapFile } from '../read/read-file';
import { shapeOf } from '../review';
import type { Exported, ExportedMap } from './exported';
import { writeCsv } from './write-csv';
import { writeGeoJson } from './write-geojson';
import { writeGpx } from './write-gpx';
import { writeKml, writeKmz } from './write-kml';

const thing = (kind: string, name: string, geometry: Exported['geometry'], notes = ''): Exported => ({
  layer: 'land',
  kind,
  name,
  notes,
  geometry,
});

const map: ExportedMap = {
  club: 'Oak & <Elm> "club"',
  madeAt: Date.UTC(2026, 10, 4),
  things: [
    thing('stand:ladder', '=cmd|x', { type: 'Point', coordinates: [-84.123456789, 34.000000001] }, 'a <b> & "c"\u0007'),
    thing('feature:travel_line', 'Cañon ✓', {
      type: 'LineString',
      coordinates: [
        [-84.1, 34.1],
        [-84.1000001, 34.1000001],
        [-84.2, 34.2],
      ],
    }),
    thing('item:wood', 'Wood', {
      type: 'Polygon',
      coordinates: [
        [
          [-84, 34],
          [-83.9, 34],
          [-83.9, 34.1],
          [-84, 34],
        ],
        [
          [-83.95, 34.01],
          [-83.94, 34.02],
          [-83.93, 34.01],
          [-83.95, 34.01],
        ],
      ],
    }),
  ],
};

describe.each([
  ['GPX', writeGpx],
  ['KML', writeKml],
  ['KMZ', writeKmz],
  ['GeoJSON', writeGeoJson],
])('%s', (_, writeMap) => {
  it('reads back as the same things of the same kinds', () => {
    const written = writeMap(map);
    const read = readMapFile(typeof written === 'string' ? new TextEncoder().encode(written) : written);
    if (!read.ok) throw new Error(read.message);
    expect(read.things.map(({ problem }) => problem)).toEqual([null, null, null]);
    for (const { name, kind, geometry } of map.things) {
      const found = read.things.find((one) => one.name === name);
      expect(found?.geometry).toEqual(geometry);
      expect(found && guessKind(found, shapeOf(geometry))).toBe(kind);
    }
  });
});

it('writes points as a table that no spreadsheet runs, with bare negative degrees', () => {
  const text = writeCsv(map);
  expect(text).toContain('"\'=cmd|x",stand:ladder,34.000000001,-84.123456789,');
  const read = readMapFile(new TextEncoder().encode(text));
  if (!read.ok) throw new Error(read.message);
  expect(read.things).toHaveLength(1);
  expect(read.things[0]).toMatchObject({ name: '=cmd|x', geometry: map.things[0]?.geometry });
});
