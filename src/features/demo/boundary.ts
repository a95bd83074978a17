import type { Polygon } from 'geojson';
import { positionOf, type Spot } from './demo-place';

/** The line round the ground, about 420 acres: the road in the south, the ridge in the north, neighbours' woods beside. */
export const BOUNDARY: readonly Spot[] = [
  [-722, -600],
  [-160, -612],
  [320, -600],
  [770, -605],
  [775, -185],
  [672, -175],
  [662, 150],
  [715, 165],
  [650, 510],
  [230, 612],
  [-95, 612],
  [-430, 655],
  [-800, 545],
  [-705, 60],
  [-675, 45],
  [-675, -255],
  [-730, -270],
];

export function boundaryPolygon(): Polygon {
  const ring = BOUNDARY.map((spot) => positionOf(spot));
  return { type: 'Polygon', coordinates: [[...ring, ...ring.slice(0, 1)]] };
}
