import type { LineString, Point, Polygon } from 'geojson';
import { COVER, FOOD } from './cover-and-food';
import { positionOf } from './demo-place';
import type { DemoFeature } from './feature-types';
import { TRAVEL } from './travel';
import { SIGN, WATER } from './water-and-sign';

export const FEATURES: readonly DemoFeature[] = [...COVER, ...FOOD, ...WATER, ...SIGN, ...TRAVEL];

export const ALL_YEAR = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12];

export function drawnOf(shape: DemoFeature['shape']): Point | LineString | Polygon {
  if ('point' in shape) return { type: 'Point', coordinates: positionOf(shape.point) };
  if ('line' in shape) return { type: 'LineString', coordinates: shape.line.map((spot) => positionOf(spot)) };
  const ring = shape.area.map((spot) => positionOf(spot));
  return { type: 'Polygon', coordinates: [[...ring, ...ring.slice(0, 1)]] };
}
