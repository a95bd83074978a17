import L from 'leaflet';
import 'leaflet/dist/leaflet.css';
import './map.css';
import type { Geometry, Position } from 'geojson';
import type { LatLon } from '@/core/geometry';
import type { MapThing } from '../thing';
import { PANES } from './paint-style';

export function latLng([lon = 0, lat = 0]: Position): L.LatLng {
  return L.latLng(lat, lon);
}

/** Nearer than this, every stand shows its winds. */
export const CLOSE_ZOOM = 15;

/** An empty map of paper. Nothing is asked of any server. */
export function makeMap(container: HTMLElement, centre: LatLon, compact: boolean): L.Map {
  const map = L.map(container, {
    center: [centre.lat, centre.lon],
    zoom: 15,
    minZoom: 8,
    maxZoom: 21,
    zoomSnap: 0.25,
    zoomDelta: 0.5,
    attributionControl: false,
    // A page with a map in it must scroll past the map.
    scrollWheelZoom: !compact,
    zoomAnimation: !window.matchMedia('(prefers-reduced-motion: reduce)').matches,
  });
  // From afar the marks shrink and only the chosen stand keeps its brackets.
  const far = () => container.classList.toggle('m-far', map.getZoom() < CLOSE_ZOOM);
  map.on('zoomend', far);
  map.whenReady(far);
  for (const [name, z] of Object.entries(PANES)) map.createPane(name).style.zIndex = String(z);
  const labels = map.getPane('labels');
  labels?.classList.add('m-labels');
  labels?.setAttribute('aria-hidden', 'true');
  return map;
}

function positionsOf(geometry: Geometry): Position[] {
  switch (geometry.type) {
    case 'Point':
      return [geometry.coordinates];
    case 'MultiPoint':
    case 'LineString':
      return geometry.coordinates;
    case 'MultiLineString':
    case 'Polygon':
      return geometry.coordinates.flat();
    case 'MultiPolygon':
      return geometry.coordinates.flat(2);
    case 'GeometryCollection':
      return geometry.geometries.flatMap(positionsOf);
  }
}

export function boundsOf(geometries: readonly Geometry[]): L.LatLngBounds {
  return L.latLngBounds(geometries.flatMap(positionsOf).map(latLng));
}

/** The ground that a map opens on: the boundary, else all that is drawn, else the club's own place. */
export function openingBounds(things: readonly MapThing[]): L.LatLngBounds | null {
  const boundary = things.filter((thing) => thing.kind === 'item' && thing.what === 'boundary');
  const bounds = boundsOf((boundary.length > 0 ? boundary : things).map(({ geometry }) => geometry));
  return bounds.isValid() ? bounds : null;
}
