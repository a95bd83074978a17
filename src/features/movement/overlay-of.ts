import type { WindowName } from '@/core/condition-types';
import type { MapOverlay } from '@/features/map/overlay';
import type { LineView } from './reads';

export type DrawnLine = Pick<LineView, 'id' | 'name' | 'morning' | 'legs' | 'gaps'>;

/** What the lines of movement lay over a map in a window: legs with the deer's way, gaps, and the stands that reach a leg. */
export function movementOverlay(lines: readonly DrawnLine[], window: WindowName): MapOverlay {
  const legs = lines.flatMap(({ legs: own, morning }) =>
    own.map(({ number, path, stands }) => {
      const way = morning === null ? null : window === 'morning' ? morning : morning === 1 ? -1 : 1;
      return { name: String(number), path, served: stands.length > 0, way: way as 1 | -1 | null };
    }),
  );
  const reaches = lines.flatMap(({ legs: own }) =>
    own.flatMap(({ stands }) => stands.map(({ at, aim }) => ({ from: at, to: aim }))),
  );
  return { legs, gaps: lines.flatMap(({ gaps }) => gaps.map(({ path }) => path)), reaches };
}
