import type { Position } from 'geojson';
import { AREA_MARK } from '../read/read-gpx';
import { degrees, type Exported, type ExportedMap, ringsOf, xml } from './exported';

const place = ([lon, lat]: Position) => `lat="${degrees(lat)}" lon="${degrees(lon)}"`;

/** In the order GPX 1.1 lays down for wptType and trkType. */
function said({ name, notes, kind }: Exported, mark: string): string {
  return `<name>${xml(name)}</name>${notes ? `<desc>${xml(notes)}</desc>` : ''}<type>${mark}${xml(kind)}</type>`;
}

function track(thing: Exported): string {
  const segments = ringsOf(thing.geometry).map(
    (line) => `<trkseg>${line.map((p) => `<trkpt ${place(p)}/>`).join('')}</trkseg>`,
  );
  const mark = thing.geometry.type === 'Polygon' ? `${AREA_MARK} ` : '';
  return `<trk>${said(thing, mark)}${segments.join('')}</trk>`;
}

/** GPX 1.1: points as waypoints, lines and the outlines of areas as tracks. */
export function writeGpx({ club, madeAt, things }: ExportedMap): string {
  const points = things.flatMap((thing) =>
    thing.geometry.type === 'Point' ? [`<wpt ${place(thing.geometry.coordinates)}>${said(thing, '')}</wpt>`] : [],
  );
  const tracks = things.filter(({ geometry }) => geometry.type !== 'Point').map(track);
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    '<gpx xmlns="http://www.topografix.com/GPX/1/1" version="1.1" creator="Windrest">',
    `<metadata><name>${xml(club)}</name><time>${new Date(madeAt).toISOString()}</time></metadata>`,
    ...points,
    ...tracks,
    '</gpx>',
    '',
  ].join('\n');
}
