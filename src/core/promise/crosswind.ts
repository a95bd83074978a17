import { toRad } from '../angles';
import type { PromiseSettings } from './promise-settings';

/** Mean of |sin| over all directions: where the wind has no direction of its own. */
const ANY_WIND = 2 / Math.PI;

/** 0 (wind along the line) to 1 (straight across it); about 0.64 when the direction is unknown. */
export function crosswindShare(windFromDeg: number | null, lineDeg: number): number {
  return windFromDeg === null ? ANY_WIND : Math.abs(Math.sin(toRad(windFromDeg - lineDeg)));
}

/** Factor on the use of a travel line in range; 1 when the wind's direction is unknown. Practice. */
export function crosswindFactor(share: number, s: PromiseSettings): number {
  return share >= ANY_WIND
    ? 1 + (s.crosswindSpan * (share - ANY_WIND)) / (1 - ANY_WIND)
    : 1 - (s.crosswindSpan * (ANY_WIND - share)) / ANY_WIND;
}
