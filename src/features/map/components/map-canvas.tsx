'use client';

import type { Position } from 'geojson';
import L from 'leaflet';
import { type Ref, useEffect, useImperativeHandle, useRef, useState } from 'react';
import type { GoodWindArc } from '@/core/ground-types';
import type { DrawnShape } from '@/core/map-layers';
import type { DrawnGeometry } from '@/features/ground/geometry-text';
import { isDrawn } from '../drawing/list-changes';
import { snapIndex, snapTo } from '../drawing/snap';
import { arcHandles } from '../leaflet/arc-handles';
import { type DrawTool, makeDrawTool } from '../leaflet/draw-tool';
import { boundsOf, latLng, makeMap, openingBounds } from '../leaflet/make-map';
import { paintLabels } from '../leaflet/paint-labels';
import { paintOverlay } from '../leaflet/paint-overlay';
import { readInks } from '../leaflet/paint-style';
import { paintThings } from '../leaflet/paint-things';
import { seatHandle } from '../leaflet/seat-handle';
import type { MapOverlay } from '../overlay';
import type { MapThing, MapView } from '../thing';
import { MAP_CANVAS_WORDS } from '../words/screen';
import { MapPatterns } from './map-patterns';
import { ScaleAndNorth } from './scale-and-north';
import { useLight } from './use-light';

/** What the pointer does. */
export type MapTool =
  | { mode: 'look' }
  | { mode: 'draw'; shape: DrawnShape }
  | { mode: 'reshape'; id: string; round: number }
  | { mode: 'measure' };

export interface MapHandle {
  finish: () => void;
  undoPoint: () => void;
  showAll: () => void;
  show: (thing: MapThing) => void;
}

export interface MapCanvasProps {
  view: Pick<MapView, 'club' | 'declinationDeg' | 'imagery'>;
  things: readonly MapThing[];
  label: string;
  /** What the map opens on; left out: the boundary, or all of it. */
  frame?: readonly MapThing[];
  className: string;
  compact?: boolean;
  tool?: MapTool;
  selectedId?: string | null;
  /** Things held back, drawn faintly. */
  faint?: ReadonlySet<string>;
  overlay?: MapOverlay | null;
  imagery?: boolean;
  /** The stand whose arcs may be turned by hand. */
  turning?: { at: Position; arcs: readonly GoodWindArc[] } | null;
  /** A seat that may be moved by hand. */
  seat?: { at: Position; label: string } | null;
  onSeat?: (at: Position) => void;
  onSelect?: (id: string | null) => void;
  onDrawn?: (geometry: DrawnGeometry) => void;
  onReshaped?: (geometry: DrawnGeometry) => void;
  onProgress?: (geometry: DrawnGeometry | null) => void;
  onMeasure?: (at: Position) => void;
  onTurn?: (arcs: GoodWindArc[]) => void;
  onRefused?: (message: string) => void;
  ref?: Ref<MapHandle>;
}

const SNAP_PX = 14;
const NOTHING: ReadonlySet<string> = new Set();
const LOOK: MapTool = { mode: 'look' };

interface Parts {
  map: L.Map;
  things: ReturnType<typeof paintThings>;
  labels: ReturnType<typeof paintLabels>;
  overlay: ReturnType<typeof paintOverlay>;
  handles: ReturnType<typeof arcHandles>;
  seat: ReturnType<typeof seatHandle>;
}

/** The map itself. Everything it shows is given to it; what is done on it is told by its events. */
export function MapCanvas(props: MapCanvasProps) {
  const {
    view,
    things,
    tool = LOOK,
    selectedId = null,
    faint = NOTHING,
    overlay = null,
    turning = null,
    seat = null,
  } = props;
  const { club } = view;
  const host = useRef<HTMLDivElement>(null);
  const [parts, setParts] = useState<Parts | null>(null);
  const light = useLight();
  const draw = useRef<DrawTool | null>(null);
  // The tap that ends a shape is heard once more as a click, when the tool is already laid down.
  const spent = useRef(false);
  // Leaflet's handlers live longer than a render: they read what holds now.
  const now = useRef(props);
  now.current = props;

  // biome-ignore lint/correctness/useExhaustiveDependencies: a map is made once for a club; what it shows is kept up below
  useEffect(() => {
    const element = host.current;
    if (!element) return;
    const map = makeMap(element, club, props.compact ?? false);
    const tap = (id: string, at: L.LatLng) => {
      if (spent.current) return true;
      const { tool: current = LOOK, onSelect, onMeasure, things: list } = now.current;
      if (current.mode === 'look') {
        onSelect?.(id);
        return true;
      }
      const geometry = list.find((thing) => thing.id === id)?.geometry;
      if (current.mode !== 'measure' || geometry?.type !== 'Point') return false;
      onMeasure?.(geometry.coordinates ?? [at.lng, at.lat]);
      return true;
    };
    const made: Parts = {
      map,
      things: paintThings(map, club, { onTap: tap }, !props.compact),
      labels: paintLabels(map),
      overlay: paintOverlay(map),
      handles: arcHandles(map, (arcs) => now.current.onTurn?.(arcs)),
      seat: seatHandle(map, ({ lng, lat }) => now.current.onSeat?.([lng, lat])),
    };
    const fresh = () => {
      spent.current = false;
    };
    element.addEventListener('pointerdown', fresh, true);
    map.on('click', ({ latlng }) => {
      if (spent.current) return;
      const { tool: current = LOOK, onSelect, onMeasure } = now.current;
      if (current.mode === 'look') onSelect?.(null);
      else if (current.mode === 'measure') onMeasure?.([latlng.lng, latlng.lat]);
    });
    const bounds = props.frame ? boundsOf(props.frame.map(({ geometry }) => geometry)) : openingBounds(things);
    if (bounds?.isValid()) map.fitBounds(bounds, { padding: [32, 32], maxZoom: 17, animate: false });
    const watcher = new ResizeObserver(() => map.invalidateSize());
    watcher.observe(element);
    setParts(made);
    return () => {
      watcher.disconnect();
      element.removeEventListener('pointerdown', fresh, true);
      setParts(null);
      for (const part of [made.things, made.labels, made.overlay, made.handles, made.seat]) part.destroy();
      map.remove();
    };
  }, [club.slug]);

  const hiddenId = tool.mode === 'reshape' ? tool.id : null;
  // biome-ignore lint/correctness/useExhaustiveDependencies: another light means other inks
  useEffect(() => {
    if (!parts || !host.current) return;
    parts.things.update(things, { selectedId, hiddenId, faint, inks: readInks(host.current) });
    parts.labels.update(things, selectedId);
  }, [parts, things, selectedId, hiddenId, faint, light]);

  useEffect(() => parts?.overlay.update(overlay), [parts, overlay]);
  useEffect(() => parts?.handles.update(turning ? latLng(turning.at) : null, turning?.arcs ?? []), [parts, turning]);

  useEffect(() => parts?.seat.update(seat && { at: latLng(seat.at), label: seat.label }), [parts, seat]);

  const shape = tool.mode === 'draw' ? tool.shape : null;
  const round = tool.mode === 'reshape' ? tool.round : 0;
  // biome-ignore lint/correctness/useExhaustiveDependencies: the tool is taken up anew only when it changes
  useEffect(() => {
    if (!parts || !host.current || (shape === null && hiddenId === null)) return;
    const { map } = parts;
    const index = snapIndex(things.filter((thing) => thing.id !== hiddenId));
    const made = makeDrawTool(map, readInks(host.current), {
      snap: (at) => {
        const bounds = map.getBounds();
        const { x, y } = map.getSize();
        const reach = {
          lon: ((bounds.getEast() - bounds.getWest()) / Math.max(1, x)) * SNAP_PX,
          lat: ((bounds.getNorth() - bounds.getSouth()) / Math.max(1, y)) * SNAP_PX,
        };
        return snapTo(index, at, reach);
      },
      onProgress: (geometry) => now.current.onProgress?.(geometry),
      onDrawn: (geometry) => {
        spent.current = true;
        now.current.onDrawn?.(geometry);
      },
      onReshaped: (geometry) => now.current.onReshaped?.(geometry),
    });
    draw.current = made;
    const target = things.find((thing) => thing.id === hiddenId)?.geometry;
    if (shape) made.start(shape);
    else if (target && isDrawn(target)) {
      const refused = made.reshape(target);
      if (refused) now.current.onRefused?.(refused);
    }
    map.getContainer().focus({ preventScroll: true });
    return () => {
      draw.current = null;
      made.stop();
    };
  }, [parts, shape, hiddenId, round, light]);

  const imageryUrl = props.imagery ? view.imagery?.url : undefined;
  useEffect(() => {
    if (!parts || !imageryUrl) return;
    const tiles = L.tileLayer(imageryUrl, { maxZoom: 21, maxNativeZoom: 19 }).addTo(parts.map);
    return () => void tiles.remove();
  }, [parts, imageryUrl]);

  useImperativeHandle(
    props.ref,
    () => ({
      finish: () => draw.current?.finish(),
      undoPoint: () => draw.current?.undoPoint(),
      showAll: () => {
        const bounds = openingBounds(now.current.things);
        if (bounds) parts?.map.fitBounds(bounds, { padding: [24, 24], maxZoom: 17 });
      },
      show: (thing) => {
        const bounds = boundsOf([thing.geometry]);
        if (!parts || !bounds.isValid() || parts.map.getBounds().contains(bounds)) return;
        parts.map.fitBounds(bounds, { padding: [60, 60], maxZoom: Math.max(16, parts.map.getZoom()) });
      },
    }),
    [parts],
  );

  return (
    <div className={props.className}>
      <MapPatterns />
      <div
        ref={host}
        role="application"
        aria-label={MAP_CANVAS_WORDS.label(props.label)}
        className="m-map size-full border border-rule-strong"
      />
      {parts && <ScaleAndNorth map={parts.map} units={club.units} declinationDeg={view.declinationDeg} />}
      {imageryUrl && view.imagery?.attribution && (
        <p className="absolute right-0 bottom-0 z-10 bg-paper px-1.5 text-xs">{view.imagery.attribution}</p>
      )}
    </div>
  );
}
