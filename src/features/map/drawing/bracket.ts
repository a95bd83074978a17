import { toRad } from '@/core/angles';
import { arcWidthDeg } from '@/core/arcs';
import type { Arc } from '@/core/ground-types';

/** Screen place of a direction at a distance from the middle: north is up, clockwise, pixels. */
export function onCircle(deg: number, radius: number): [number, number] {
  return [radius * Math.sin(toRad(deg)), -radius * Math.cos(toRad(deg))];
}

const px = (value: number) => Math.round(value * 100) / 100;

/** An open bracket round a stand: the arc, and at each end a tick toward the middle. All the way round has no ends. */
export function bracketPath(arc: Arc, radius: number, tick: number): string {
  const width = arcWidthDeg(arc);
  const text = (deg: number, r: number) => onCircle(deg, r).map(px).join(' ');
  if (width >= 359.9) {
    return `M${text(0, radius)}A${radius} ${radius} 0 1 1 ${text(180, radius)}A${radius} ${radius} 0 1 1 ${text(0, radius)}`;
  }
  const to = arc.fromDeg + width;
  const large = width > 180 ? 1 : 0;
  return `M${text(arc.fromDeg, radius - tick)}L${text(arc.fromDeg, radius)}A${radius} ${radius} 0 ${large} 1 ${text(to, radius)}L${text(to, radius - tick)}`;
}

/** The direction of a spot of the screen from the middle, whole degrees. */
export function dragDeg(x: number, y: number): number {
  return (Math.round((Math.atan2(x, -y) * 180) / Math.PI) + 360) % 360;
}
