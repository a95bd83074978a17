import { strToU8, zipSync } from 'fflate';
import type { Position } from 'geojson';
import { EXPORT_LAYERS } from '../exchange-schema';
import { LAYER_TITLES } from '../words/export';
import { degrees, type Exported, type ExportedMap, xml } from './exported';

const places = (line: Position[]) =>
  `<coordinates>${line.map(([lon, lat]) => `${degrees(lon)},${degrees(lat)}`).join(' ')}</coordinates>`;

function shape({ geometry }: Exported): string {
  if (geometry.type === 'Point') return `<Point>${places([geometry.coordinates])}</Point>`;
  if (geometry.type === 'LineString') return `<LineString>${places(geometry.coordinates)}</LineString>`;
  const rings = geometry.coordinates.map((ring, i) => {
    const side = i === 0 ? 'outer' : 'inner';
    return `<${side}BoundaryIs><LinearRing>${places(ring)}</LinearRing></${side}BoundaryIs>`;
  });
  return `<Polygon>${rings.join('')}</Polygon>`;
}

function placemark(thing: Exported): string {
  const description = thing.notes ? `<description>${xml(thing.notes)}</description>` : '';
  const kind = `<ExtendedData><Data name="kind"><value>${xml(thing.kind)}</value></Data></ExtendedData>`;
  return `<Placemark><name>${xml(thing.name)}</name>${description}${kind}${shape(thing)}</Placemark>`;
}

/** KML 2.2 with a folder for each layer. */
export function writeKml({ club, things }: ExportedMap): string {
  const folders = EXPORT_LAYERS.flatMap((layer) => {
    const own = things.filter((thing) => thing.layer === layer);
    if (own.length === 0) return [];
    return [`<Folder><name>${LAYER_TITLES[layer]}</name>`, ...own.map(placemark), '</Folder>'];
  });
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<kml xmlns="http://www.opengis.net/kml/2.2"><Document><name>${xml(club)}</name>`,
    ...folders,
    '</Document></kml>',
    '',
  ].join('\n');
}

/** The same in an archive, the way KMZ holds it. */
export function writeKmz(map: ExportedMap): Uint8Array {
  return zipSync({ 'doc.kml': strToU8(writeKml(map)) }, { mtime: map.madeAt });
}
