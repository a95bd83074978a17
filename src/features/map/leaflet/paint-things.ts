import type { Geometry, Position } from 'geojson';
import L from 'leaflet';
import { arcWidthDeg } from '@/core/arcs';
import { fromLocal, type LatLon, pointAt, toLocal } from '@/core/geometry';
import { formatWinds } from '@/features/ground/view';
import { bracketPath } from '../drawing/bracket';
import type { ItemThing, MapThing, StandThing } from '../thing';
import { FACT_WORDS } from '../words/facts';
import { nameOf, whatOf } from '../words/things';
import { signOf } from './glyphs';
import { latLng } from './make-map';
import { canvasStyle, classOf, type Inks, paneOf } from './paint-style';

/** More lines and areas than this are drawn on a canvas: the SVG's thousand nodes begin to drag. */
export const DENSE = 1200;

const BRACKET_PX = { both: 22, morning: 19, evening: 26 } as const;

function bracketsOf(stand: StandThing): string {
  const paths = stand.arcs.map((arc) => {
    const d = bracketPath(arc, BRACKET_PX[arc.window ?? 'both'], 7);
    return `<path class="m-bracket-halo" d="${d}"/><path class="m-bracket" d="${d}"/>`;
  });
  return `<g class="m-bracket-set">${paths.join('')}</g>`;
}

/** What a screen reader says of a mark. */
export function markText(thing: MapThing): string {
  const winds =
    thing.kind === 'stand' && thing.arcs.length > 0 ? `, ${FACT_WORDS.goodWinds(formatWinds(thing.arcs))}` : '';
  return `${nameOf(thing)}${thing.name ? `, ${whatOf(thing).toLowerCase()}` : ''}${winds}`;
}

function markOf(thing: MapThing, at: L.LatLng, live: boolean): L.Marker {
  const body = document.createElement('span');
  body.className = 'm-mark';
  body.innerHTML = `<svg width="28" height="28" viewBox="-14 -14 28 28" aria-hidden="true" focusable="false">${
    thing.kind === 'stand' ? bracketsOf(thing) : ''
  }${signOf(thing)}</svg>`;
  const words = document.createElement('span');
  words.className = 'sr-only';
  words.textContent = markText(thing);
  body.append(words);
  const warn = thing.kind === 'item' && (thing.what === 'hazard' || thing.what === 'no_shoot');
  const tone = thing.kind === 'stand' ? 'm-mark-stand' : warn ? 'm-mark-warn' : `m-mark-${thing.kind}`;
  return L.marker(at, {
    icon: L.divIcon({ className: `m-mark ${tone}`, html: body, iconSize: [28, 28] }),
    keyboard: live && thing.kind === 'stand',
    interactive: live,
    zIndexOffset: thing.kind === 'stand' ? 1000 : 0,
  });
}

/** A no-shoot sector as an area, in degrees. */
function sectorRing(centre: LatLon, item: ItemThing, apex: Position): L.LatLng[] {
  const { sector } = item.props;
  if (!sector) return [];
  const [lon = 0, lat = 0] = apex;
  const at = toLocal(centre, { lat, lon });
  const width = arcWidthDeg(sector);
  const edge = Array.from({ length: 13 }, (_, i) => {
    const p = fromLocal(centre, pointAt(at, sector.fromDeg + (width * i) / 12, sector.reachM));
    return L.latLng(p.lat, p.lon);
  });
  return width >= 360 ? edge : [latLng(apex), ...edge];
}

interface Painted {
  thing: MapThing;
  dense: boolean;
  group: L.LayerGroup;
  /** How it was dressed last: only what differs is dressed again. */
  dress: string;
}

export interface PainterEvents {
  /** A tap on a thing; answer false to let the map have it. */
  onTap: (id: string, at: L.LatLng) => boolean;
}

/** Keeps the map's layers alike to a list of things; only what changed is drawn again. */
export function paintThings(map: L.Map, centre: LatLon, events: PainterEvents, live = true) {
  const painted = new Map<string, Painted>();
  const svg = new Map<string, L.Renderer>();
  const canvas = new Map<string, L.Renderer>();
  const rendererOf = (pane: string, dense: boolean) => {
    const kept = dense ? canvas : svg;
    const known = kept.get(pane) ?? (dense ? L.canvas({ pane, tolerance: 8 }) : L.svg({ pane }));
    kept.set(pane, known);
    return known;
  };

  function draw(thing: MapThing, dense: boolean, inks: Inks): L.LayerGroup {
    const group = L.layerGroup();
    const pane = paneOf(thing);
    const renderer = rendererOf(pane, dense);
    const options = (className: string): L.PathOptions => ({
      pane,
      renderer,
      className,
      interactive: live,
      ...(dense ? canvasStyle(thing, inks) : {}),
    });
    const tap = (layer: L.Layer) =>
      layer.on('click', (event: L.LeafletMouseEvent) => {
        if (events.onTap(thing.id, event.latlng)) L.DomEvent.stopPropagation(event);
      });
    const line = (points: Position[], className: string) =>
      group.addLayer(L.polyline(points.map(latLng), { ...options(className), fill: false }));
    const lines = (parts: Position[][]) => {
      for (const part of parts) {
        if (thing.kind === 'item' && thing.what === 'road' && !dense) line(part, 'm-path m-road-case');
        line(part, classOf(thing));
        if (thing.kind === 'approach' && thing.vehicleToIndex > 0)
          line(part.slice(0, thing.vehicleToIndex + 1), 'm-path m-driven');
        if (live && !dense) tap(L.polyline(part.map(latLng), { pane, renderer, className: 'm-hit' }).addTo(group));
      }
    };
    const area = (rings: Position[][]) =>
      group.addLayer(
        L.polygon(
          rings.map((ring) => ring.slice(0, -1).map(latLng)),
          { ...options(classOf(thing)), fill: true, ...(dense ? canvasStyle(thing, inks) : {}) },
        ),
      );
    const point = (at: Position) => {
      if (thing.kind === 'item' && thing.props.sector) {
        const fan = { ...options('m-path m-no_shoot m-area'), interactive: false, fill: true };
        group.addLayer(L.polygon(sectorRing(centre, thing, at), fan));
      }
      if (dense && thing.kind !== 'stand')
        group.addLayer(L.circleMarker(latLng(at), { ...options('m-path'), radius: 4 }));
      else group.addLayer(markOf(thing, latLng(at), live));
    };
    const all = (geometry: Geometry): void => {
      if (geometry.type === 'Point') point(geometry.coordinates);
      else if (geometry.type === 'MultiPoint') geometry.coordinates.forEach(point);
      else if (geometry.type === 'LineString') lines([geometry.coordinates]);
      else if (geometry.type === 'MultiLineString') lines(geometry.coordinates);
      else if (geometry.type === 'Polygon') area(geometry.coordinates);
      else if (geometry.type === 'MultiPolygon') geometry.coordinates.forEach(area);
      else geometry.geometries.forEach(all);
    };
    all(thing.geometry);
    if (live) group.eachLayer((layer) => tap(layer));
    return group.addTo(map);
  }

  function mark(one: Painted, selected: boolean, faint: boolean, inks: Inks) {
    const { thing, group, dense } = one;
    const dress = `${selected} ${faint} ${dense ? inks.ink : ''}`;
    if (one.dress === dress) return;
    one.dress = dress;
    group.eachLayer((layer) => {
      const element = layer instanceof L.Path || layer instanceof L.Marker ? layer.getElement() : null;
      if (element && !element.classList.contains('m-hit')) {
        element.classList.toggle('m-selected', selected);
        element.classList.toggle('m-faint', faint);
      } else if (dense && layer instanceof L.Path) {
        layer.setStyle(selected ? { color: inks.clay, weight: 4 } : canvasStyle(thing, inks));
      }
    });
  }

  return {
    update(
      things: readonly MapThing[],
      state: { selectedId: string | null; hiddenId: string | null; faint: ReadonlySet<string>; inks: Inks },
    ): void {
      const shapes = things.filter(({ geometry }) => geometry.type !== 'Point').length;
      const dense = shapes > DENSE;
      const shown = new Map(things.filter((thing) => thing.id !== state.hiddenId).map((thing) => [thing.id, thing]));
      for (const [id, old] of painted) {
        if (shown.get(id) === old.thing && old.dense === dense) continue;
        old.group.remove();
        painted.delete(id);
      }
      for (const thing of shown.values()) {
        if (!painted.has(thing.id))
          painted.set(thing.id, {
            thing,
            dense,
            group: draw(thing, dense, state.inks),
            dress: ['false', 'false', dense ? state.inks.ink : ''].join(' '),
          });
      }
      for (const one of painted.values())
        mark(one, one.thing.id === state.selectedId, state.faint.has(one.thing.id), state.inks);
    },
    destroy(): void {
      for (const { group } of painted.values()) group.remove();
      painted.clear();
    },
  };
}
export type ThingPainter = ReturnType<typeof paintThings>;
