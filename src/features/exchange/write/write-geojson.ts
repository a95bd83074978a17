import type { Position } from 'geojson';
import { degrees, type ExportedMap } from './exported';

const place = ([lon, lat]: Position): Position => [Number(degrees(lon)), Number(degrees(lat))];

/** GeoJSON (RFC 7946), one feature to a line. */
export function writeGeoJson({ club, things }: ExportedMap): string {
  const lines = things.map(({ geometry, name, kind, notes, layer }) => {
    const shape =
      geometry.type === 'Point'
        ? { ...geometry, coordinates: place(geometry.coordinates) }
        : geometry.type === 'LineString'
          ? { ...geometry, coordinates: geometry.coordinates.map(place) }
          : { ...geometry, coordinates: geometry.coordinates.map((ring) => ring.map(place)) };
    return JSON.stringify({ type: 'Feature', properties: { name, kind, layer, notes }, geometry: shape });
  });
  return `{"type":"FeatureCollection","name":${JSON.stringify(club)},"features":[\n${lines.join(',\n')}\n]}\n`;
}
