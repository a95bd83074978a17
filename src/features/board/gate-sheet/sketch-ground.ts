import { type LatLon, toLocal } from '@/core/geometry';
import type { Point } from '@/core/ground-types';
import type { Units } from '@/core/units';
import { scaleBar } from '@/features/map/drawing/scale-bar';

export interface SketchInput {
  centre: LatLon;
  units: Units;
  stands: (LatLon & { id: string })[];
  parkings: (LatLon & { name: string })[];
  /** [lon, lat] each. */
  lines: { kind: 'boundary' | 'road' | 'way'; points: number[][]; closed: boolean }[];
}

/** A sketch in its own units, x right and y down, north up. */
export interface Sketch {
  width: number;
  height: number;
  stands: { id: string; x: number; y: number }[];
  parkings: { name: string; x: number; y: number; side: 'left' | 'right' }[];
  lines: { kind: 'boundary' | 'road' | 'way'; path: string }[];
  scale: { label: string; length: number } | null;
}

const WIDTH = 720;
const MOST_HEIGHT = 480;
const MARGIN = 34;
/** Ground of no width at all still has a scale. */
const LEAST_SPAN_M = 200;
const SCALE_WIDTH = 160;

const round = (value: number) => Math.round(value * 10) / 10;

/** Lays a club's ground out on paper, as large as it fits. null: there is nothing to lay out. */
export function sketchGround(input: SketchInput): Sketch | null {
  const local = (at: LatLon) => toLocal(input.centre, at);
  const pointOf = ([lon = 0, lat = 0]: number[]) => local({ lat, lon });
  const lines = input.lines.map((line) => ({ ...line, at: line.points.map(pointOf) }));
  const all = [...input.stands.map(local), ...input.parkings.map(local), ...lines.flatMap(({ at }) => at)];
  if (all.length === 0) return null;
  const east = all.map(({ eastM }) => eastM);
  const north = all.map(({ northM }) => northM);
  const [west, top] = [Math.min(...east), Math.max(...north)];
  const spanEast = Math.max(LEAST_SPAN_M, Math.max(...east) - west);
  const spanNorth = Math.max(LEAST_SPAN_M, top - Math.min(...north));
  const perMetre = Math.min((WIDTH - 2 * MARGIN) / spanEast, (MOST_HEIGHT - 2 * MARGIN) / spanNorth);
  const left = (WIDTH - spanEast * perMetre) / 2;
  const place = ({ eastM, northM }: Point) => ({
    x: round(left + (eastM - west) * perMetre),
    y: round(MARGIN + (top - northM) * perMetre),
  });
  const bar = scaleBar(1 / perMetre, SCALE_WIDTH, input.units);
  return {
    width: WIDTH,
    height: Math.ceil(spanNorth * perMetre + 2 * MARGIN),
    stands: input.stands.map((stand) => ({ id: stand.id, ...place(local(stand)) })),
    parkings: input.parkings.map((parking) => {
      const { x, y } = place(local(parking));
      return { name: parking.name, x, y, side: x > WIDTH * 0.7 ? 'left' : 'right' };
    }),
    lines: lines
      .filter(({ at }) => at.length > 1)
      .map(({ kind, at, closed }) => ({
        kind,
        path: `M${at
          .map(place)
          .map(({ x, y }) => `${x} ${y}`)
          .join('L')}${closed ? 'Z' : ''}`,
      })),
    scale: bar && { label: bar.label, length: round(bar.px) },
  };
}
