import L from 'leaflet';
import { normalizeDeg } from '@/core/angles';
import { arcWidthDeg } from '@/core/arcs';
import type { GoodWindArc } from '@/core/ground-types';
import { dragDeg, onCircle } from '../drawing/bracket';

const RADIUS_PX = 44;

/** Two handles for each arc of a stand, turned round it by dragging. */
export function arcHandles(map: L.Map, onTurn: (arcs: GoodWindArc[]) => void) {
  let at: L.LatLng | null = null;
  let arcs: readonly GoodWindArc[] = [];
  let handles: { marker: L.Marker; arc: number; end: 'fromDeg' | 'toDeg' }[] = [];
  let dragging = false;

  function spotOf(deg: number): L.LatLng {
    if (!at) return map.getCenter();
    const middle = map.latLngToLayerPoint(at);
    const [x, y] = onCircle(deg, RADIUS_PX);
    return map.layerPointToLatLng(middle.add([x, y]));
  }

  function place(): void {
    for (const { marker, arc, end } of handles) {
      const one = arcs[arc];
      if (one) marker.setLatLng(spotOf(end === 'fromDeg' ? one.fromDeg : one.fromDeg + arcWidthDeg(one)));
    }
  }

  function turned(arc: number, end: 'fromDeg' | 'toDeg', marker: L.Marker): void {
    if (!at) return;
    const [middle, spot] = [map.latLngToLayerPoint(at), map.latLngToLayerPoint(marker.getLatLng())];
    const deg = dragDeg(spot.x - middle.x, spot.y - middle.y);
    onTurn(
      arcs.map((one, i) =>
        i === arc ? { ...one, fromDeg: normalizeDeg(one.fromDeg), toDeg: normalizeDeg(one.toDeg), [end]: deg } : one,
      ),
    );
  }

  function clear(): void {
    for (const { marker } of handles) marker.remove();
    handles = [];
  }

  function make(arc: number, end: 'fromDeg' | 'toDeg') {
    const icon = L.divIcon({ className: 'm-handle', iconSize: [22, 22] });
    const marker = L.marker([0, 0], { icon, draggable: true, keyboard: false, zIndexOffset: 2000, autoPan: false });
    marker.on('dragstart', () => {
      dragging = true;
    });
    marker.on('drag', () => turned(arc, end, marker));
    marker.on('dragend', () => {
      dragging = false;
      place();
    });
    return { marker: marker.addTo(map), arc, end };
  }

  map.on('zoomend viewreset', place);
  return {
    update(where: L.LatLng | null, next: readonly GoodWindArc[]): void {
      const same = where !== null && at?.equals(where) && next.length === arcs.length && handles.length > 0;
      at = where;
      arcs = next;
      if (dragging) return;
      if (!same) {
        clear();
        if (at) {
          handles = next.flatMap((arc, i) => (arcWidthDeg(arc) >= 360 ? [] : [make(i, 'fromDeg'), make(i, 'toDeg')]));
        }
      }
      place();
    },
    destroy(): void {
      clear();
      map.off('zoomend viewreset', place);
    },
  };
}
