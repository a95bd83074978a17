import L from 'leaflet';
import type { MapOverlay } from '../overlay';
import { latLng } from './make-map';

/** The place half-way along a path and the angle in which it runs there, degrees clockwise from up. */
function middleOf(path: L.LatLng[]): { at: L.LatLng; deg: number } | null {
  const points = path.map((p) => L.CRS.EPSG3857.project(p));
  const lengths = points.slice(1).map((p, i) => p.distanceTo(points[i] as L.Point));
  let left = lengths.reduce((a, b) => a + b, 0) / 2;
  for (const [i, length] of lengths.entries()) {
    const [a, b] = [points[i] as L.Point, points[i + 1] as L.Point];
    if (length > 0 && left <= length) {
      const at = a.add(b.subtract(a).multiplyBy(left / length));
      return { at: L.CRS.EPSG3857.unproject(at), deg: (Math.atan2(b.x - a.x, b.y - a.y) * 180) / Math.PI };
    }
    left -= length;
  }
  return null;
}

/** A leg's number on its line, with an arrow in the deer's way. */
function legMark({ name, path, way }: NonNullable<MapOverlay['legs']>[number]): L.Marker | null {
  const middle = middleOf(path.map(latLng));
  if (!middle) return null;
  const body = document.createElement('div');
  body.className = 'm-leg-mark';
  if (way !== null) {
    const deg = way === 1 ? middle.deg : middle.deg + 180;
    body.innerHTML = `<svg class="m-leg-turn" width="44" height="44" viewBox="-22 -22 44 44" aria-hidden="true">
      <path class="m-leg-arrow" transform="rotate(${deg.toFixed(1)})" d="M0 -21L7 -9H-7Z"/></svg>`;
  }
  const text = document.createElement('span');
  text.className = 'm-leg-number';
  text.textContent = name;
  body.append(text);
  const icon = L.divIcon({ className: '', html: body, iconSize: [0, 0] });
  // A number under a stand's mark would be lost: the list goes by it.
  return L.marker(middle.at, { icon, interactive: false, keyboard: false, zIndexOffset: 800 });
}

/** Lines of movement: legs, the gaps in them, and the stands that reach them. */
export function paintLines(group: L.LayerGroup, overlay: MapOverlay, into: L.PathOptions): void {
  const { legs = [], gaps = [], reaches = [] } = overlay;
  const lay = (path: L.LatLng[], className: string) => group.addLayer(L.polyline(path, { ...into, className }));
  for (const { path } of legs) lay(path.map(latLng), 'm-leg-case');
  for (const { path, served } of legs) lay(path.map(latLng), served ? 'm-leg' : 'm-leg m-leg-bare');
  for (const path of gaps) {
    lay(path.map(latLng), 'm-leg-case');
    lay(path.map(latLng), 'm-gap');
  }
  for (const { from, to } of reaches) lay([from, to].map(latLng), 'm-reach');
  for (const leg of legs) {
    const mark = legMark(leg);
    if (mark) group.addLayer(mark);
  }
}
