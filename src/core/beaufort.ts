import { BEAUFORT_WORDS } from './words/sky';

/**
 * The Beaufort scale by its WMO bounds in m/s (lowest speed of each force). The printed rows are whole mph or knots with
 * gaps between them; m/s has none, so every speed has one force.
 */
const LOWEST_MPS = [0, 0.3, 1.6, 3.4, 5.5, 8.0, 10.8, 13.9, 17.2, 20.8, 24.5, 28.5, 32.7] as const;

export interface Beaufort {
  /** 0-12. */
  force: number;
  name: string;
  onLand: string;
}

/** Force and plain words for a 10 m wind in m/s, 0 or more. A speed belongs to the force whose lowest speed it reaches. */
export function beaufort(speedMps: number): Beaufort {
  let force = 0;
  LOWEST_MPS.forEach((lowest, i) => {
    if (speedMps >= lowest) force = i;
  });
  return { force, ...(BEAUFORT_WORDS[force] ?? BEAUFORT_WORDS[0]) };
}
