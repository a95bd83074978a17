import type { Polygon, Position } from 'geojson';
import L from 'leaflet';
import {
  TerraDraw,
  TerraDrawLineStringMode,
  TerraDrawModeUndoRedo,
  TerraDrawPointMode,
  TerraDrawPolygonMode,
  TerraDrawSelectMode,
} from 'terra-draw';
import { TerraDrawLeafletAdapter } from 'terra-draw-leaflet-adapter';
import type { DrawnShape } from '@/core/map-layers';
import type { DrawnGeometry } from '@/features/ground/geometry-text';
import { DRAW_TOOL_WORDS } from '../words/drawing';
import type { Inks } from './paint-style';

const MODES = { point: 'point', line: 'linestring', area: 'polygon' } as const satisfies Record<DrawnShape, string>;
const MODE_OF = { Point: 'point', LineString: 'linestring', Polygon: 'polygon' } as const;
/** A fingertip reaches a corner from so far, px. */
const REACH_PX = 24;

export interface DrawEvents {
  /** The corner or side near by that a place is drawn to; null: open ground. */
  snap: (at: Position) => Position | null;
  /** The shape as it stands while it is being drawn; null before its first point. */
  onProgress: (geometry: DrawnGeometry | null) => void;
  onDrawn: (geometry: DrawnGeometry) => void;
  onReshaped: (geometry: DrawnGeometry) => void;
}

const NINE = 1e9;
const round = ([lon = 0, lat = 0]: Position): Position => [
  Math.round(lon * NINE) / NINE,
  Math.round(lat * NINE) / NINE,
];

/** As the drawing library takes it: nine decimals, and of an area the outer ring alone. */
function forTool(geometry: DrawnGeometry): DrawnGeometry {
  if (geometry.type === 'Point') return { type: 'Point', coordinates: round(geometry.coordinates) };
  if (geometry.type === 'LineString') return { type: 'LineString', coordinates: geometry.coordinates.map(round) };
  return { type: 'Polygon', coordinates: geometry.coordinates.slice(0, 1).map((ring) => ring.map(round)) };
}

function stylesOf({ clay, panel }: Inks) {
  const point = { pointColor: panel, pointOutlineColor: clay, pointOutlineWidth: 3, pointWidth: 7 };
  const dots = {
    closingPointColor: panel,
    closingPointOutlineColor: clay,
    closingPointOutlineWidth: 3,
    closingPointWidth: 7,
    snappingPointColor: clay,
    snappingPointOutlineColor: panel,
    snappingPointOutlineWidth: 2,
    snappingPointWidth: 6,
  };
  return {
    point,
    line: { lineStringColor: clay, lineStringWidth: 3, ...dots },
    area: { fillColor: clay, fillOpacity: 0.12, outlineColor: clay, outlineWidth: 3, ...dots },
    select: {
      selectedPointColor: panel,
      selectedPointOutlineColor: clay,
      selectedPointOutlineWidth: 4,
      selectedPointWidth: 10,
      selectedLineStringColor: clay,
      selectedLineStringWidth: 3,
      selectedPolygonColor: clay,
      selectedPolygonFillOpacity: 0.12,
      selectedPolygonOutlineColor: clay,
      selectedPolygonOutlineWidth: 3,
      selectionPointColor: panel,
      selectionPointOutlineColor: clay,
      selectionPointOutlineWidth: 3,
      selectionPointWidth: 8,
      midPointColor: clay,
      midPointOutlineColor: panel,
      midPointOutlineWidth: 2,
      midPointWidth: 5,
    },
  };
}

/** Drawing and reshaping with the pointer, one shape at a time. */
export function makeDrawTool(map: L.Map, inks: Inks, events: DrawEvents) {
  const snapping = { toCustom: ({ lng, lat }: { lng: number; lat: number }) => events.snap([lng, lat]) ?? undefined };
  const styles = stylesOf(inks);
  const flags = {
    feature: {
      draggable: true,
      coordinates: { midpoints: true, draggable: true, deletable: true, snappable: snapping },
    },
  };
  const draw = new TerraDraw({
    adapter: new TerraDrawLeafletAdapter({ lib: L, map, coordinatePrecision: 9 }),
    undoRedo: { modeLevel: new TerraDrawModeUndoRedo() },
    modes: [
      new TerraDrawPointMode({ styles: styles.point }),
      new TerraDrawLineStringMode({ styles: styles.line, snapping, pointerDistance: REACH_PX }),
      new TerraDrawPolygonMode({ styles: styles.area, snapping, pointerDistance: REACH_PX }),
      new TerraDrawSelectMode({
        styles: styles.select,
        pointerDistance: REACH_PX,
        allowManualDeselection: false,
        flags: { point: { feature: { draggable: true } }, linestring: flags, polygon: flags },
      }),
    ],
  });
  let holes: Position[][] = [];
  let running: 'draw' | 'reshape' | null = null;

  function shapeOf(id: string | number): DrawnGeometry | null {
    const geometry = draw.getSnapshotFeature(id)?.geometry;
    if (geometry?.type === 'Point' || geometry?.type === 'LineString') return geometry;
    if (geometry?.type !== 'Polygon') return null;
    const polygon: Polygon = { type: 'Polygon', coordinates: [...geometry.coordinates, ...holes] };
    return polygon;
  }

  draw.on('change', (ids) => {
    if (running === null) return;
    const drawn = draw.getSnapshot().find(({ id, properties }) => {
      const helper =
        properties.midPoint || properties.selectionPoint || properties.closingPoint || properties.snappingPoint;
      return id !== undefined && !helper && (running === 'reshape' || ids.includes(id));
    });
    const shape = drawn?.id === undefined ? null : shapeOf(drawn.id);
    if (shape) events.onProgress(shape);
  });
  draw.on('finish', (id, context) => {
    const shape = shapeOf(id);
    if (!shape) return;
    if (context.action === 'draw') events.onDrawn(shape);
    else events.onReshaped(shape);
  });

  function press(key: string): void {
    map.getContainer().dispatchEvent(new KeyboardEvent('keyup', { key, bubbles: true }));
  }

  function begin(): void {
    map.getContainer().classList.add('m-drawing');
    if (!draw.enabled) draw.start();
    draw.clear();
    holes = [];
  }

  return {
    start(shape: DrawnShape): void {
      begin();
      running = 'draw';
      draw.setMode(MODES[shape]);
      events.onProgress(null);
    },
    reshape(geometry: DrawnGeometry): string | null {
      begin();
      running = 'reshape';
      holes = geometry.type === 'Polygon' ? geometry.coordinates.slice(1) : [];
      const id = draw.getFeatureId();
      const [added] = draw.addFeatures([
        { id, type: 'Feature', geometry: forTool(geometry), properties: { mode: MODE_OF[geometry.type] } },
      ]);
      if (!added?.valid) return added?.reason ?? DRAW_TOOL_WORDS.notByHand;
      draw.setMode('select');
      draw.selectFeature(id);
      events.onProgress(geometry);
      return null;
    },
    /** Ends the line or area that is being drawn where it is. */
    finish: () => press('Enter'),
    undoPoint(): void {
      if (draw.enabled && draw.canUndo()) draw.undo();
    },
    stop(): void {
      running = null;
      map.getContainer().classList.remove('m-drawing');
      if (draw.enabled) draw.stop();
    },
  };
}
export type DrawTool = ReturnType<typeof makeDrawTool>;
