import L from 'leaflet';
import { toRad } from '@/core/angles';
import type { MapOverlay } from '../overlay';
import { latLng } from './make-map';
import { paintLines } from './paint-lines';

/** Lightest to heaviest line of a walk, px. */
const THIN_PX = 3;
const THICK_PX = 13;

function badge(text: string, at: L.LatLng): L.Marker {
  const body = document.createElement('div');
  body.className = 'm-sitter';
  body.textContent = text;
  return L.marker(at, {
    icon: L.divIcon({ className: '', html: body, iconSize: [0, 0], iconAnchor: [-14, 26] }),
    interactive: false,
    keyboard: false,
  });
}

function sun(at: L.LatLng, azimuthDeg: number): L.Marker {
  const [x, y] = [Math.sin(toRad(azimuthDeg)), -Math.cos(toRad(azimuthDeg))];
  const html = `<svg class="m-sun" width="180" height="180" viewBox="-90 -90 180 180" aria-hidden="true">
    <path d="M${x * 34} ${y * 34}L${x * 66} ${y * 66}" stroke="currentColor" stroke-width="2" stroke-dasharray="3 4"/>
    <circle cx="${x * 76}" cy="${y * 76}" r="8" fill="currentColor"/></svg>`;
  return L.marker(at, {
    icon: L.divIcon({ className: '', html, iconSize: [180, 180] }),
    interactive: false,
    keyboard: false,
  });
}

/** What a moment or the shape of the ground lays over the map. */
export function paintOverlay(map: L.Map) {
  const group = L.layerGroup().addTo(map);
  const renderers = new Map<string, L.Renderer>();
  const into = (pane: string) => {
    const renderer = renderers.get(pane) ?? L.svg({ pane });
    renderers.set(pane, renderer);
    return { pane, renderer, interactive: false };
  };
  return {
    update(overlay: MapOverlay | null): void {
      group.clearLayers();
      if (!overlay) return;
      for (const line of overlay.contours ?? []) {
        group.addLayer(L.polyline(line.map(latLng), { ...into('contours'), className: 'm-contour', fill: false }));
      }
      for (const band of overlay.bands ?? []) {
        const rings = band.coordinates.map((part) => part.map((ring) => ring.map(latLng)));
        group.addLayer(L.polygon(rings, { ...into('scent'), className: 'm-band' }));
      }
      for (const { from, to, weight } of overlay.stretches ?? []) {
        const ends = [latLng(from), latLng(to)];
        const width = THIN_PX + (THICK_PX - THIN_PX) * Math.min(1, Math.max(0, weight));
        group.addLayer(L.polyline(ends, { ...into('ways'), className: 'm-stretch-case', weight: width + 3 }));
      }
      for (const { from, to, weight } of overlay.stretches ?? []) {
        const line = L.polyline([latLng(from), latLng(to)], { ...into('ways'), className: 'm-stretch' });
        line.setStyle({ weight: THIN_PX + (THICK_PX - THIN_PX) * Math.min(1, Math.max(0, weight)) });
        group.addLayer(line);
      }
      paintLines(group, overlay, into('ways'));
      if (overlay.sun) group.addLayer(sun(latLng(overlay.sun.at), overlay.sun.azimuthDeg));
      for (const sitter of overlay.sitters ?? []) group.addLayer(badge(sitter.name, latLng(sitter.at)));
      if (overlay.here) {
        const at = latLng(overlay.here.at);
        group.addLayer(L.circle(at, { radius: overlay.here.accuracyM, ...into('ways'), className: 'm-here' }));
      }
      if (overlay.measured && overlay.measured.length > 0) {
        const points = overlay.measured.map(latLng);
        group.addLayer(L.polyline(points, { ...into('ways'), className: 'm-path m-measure' }));
        for (const point of points)
          group.addLayer(L.circleMarker(point, { ...into('ways'), radius: 5, className: 'm-measure', fill: false }));
      }
    },
    destroy: () => group.remove(),
  };
}
