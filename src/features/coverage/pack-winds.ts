import { WINDOW_NAMES } from '@/core/condition-types';
import type { CountedWind } from '@/core/coverage/cover-winds';

/** A season's winds for the browser, short: window (0 or 1), month, direction, covered (0 or 1). */
export type PackedWinds = [number, number, number, number][];

export function packWinds(winds: readonly CountedWind[]): PackedWinds {
  return winds.map(({ window, month, fromDeg, covered }) => [
    WINDOW_NAMES.indexOf(window),
    month,
    fromDeg,
    covered ? 1 : 0,
  ]);
}

export function unpackWinds(packed: PackedWinds): CountedWind[] {
  return packed.map(([window, month, fromDeg, covered]) => ({
    window: WINDOW_NAMES[window] ?? 'morning',
    month,
    fromDeg,
    covered: covered === 1,
  }));
}
