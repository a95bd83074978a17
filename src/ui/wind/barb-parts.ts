/** What a wind barb is built of, and where each piece sits on a staff that points up from the station at 0,0. */
export interface BarbParts {
  /** Speed as drawn, the nearest 5 kt. */
  knots: number;
  calm: boolean;
  pennants: number;
  full: number;
  half: number;
}

/**
 * Pieces of a barb by the manual's rule: half barb 5 kt, full barb 10 kt, pennant 50 kt, speed to the nearest 5 kt.
 * Under 2.5 kt nothing is left to draw and the sign is calm. Negative or unknown speeds count as calm.
 * Source: WMO-No. 485, appendix II-4 (plotting of wind) [value from memory].
 */
export function barbParts(knots: number): BarbParts {
  const rounded = Number.isFinite(knots) && knots > 0 ? Math.round(knots / 5) * 5 : 0;
  const pennants = Math.floor(rounded / 50);
  const full = Math.floor((rounded % 50) / 10);
  const half = rounded % 10 === 5 ? 1 : 0;
  return { knots: rounded, calm: rounded === 0, pennants, full, half };
}

export interface BarbMarks {
  /** Lines of the staff and barbs. */
  lines: string;
  /** Filled pennants. */
  fills: string;
}

export const STAFF = 16;
const GAP = 3;
const REACH = 8;
const RISE = 3;

/**
 * Feathers stand on the clockwise side of the staff: on the left of a person with the wind at his back, the side of low
 * pressure in the northern hemisphere. They lean toward the tail; a lone half barb is set in from the end.
 */
export function barbMarks(parts: BarbParts): BarbMarks {
  if (parts.calm) return { lines: '', fills: '' };
  let lines = `M0 0V-${STAFF}`;
  let fills = '';
  let at = STAFF;
  for (let i = 0; i < parts.pennants; i += 1) {
    fills += `M0 -${at}L${REACH} -${at - GAP / 2}L0 -${at - GAP - 1}z`;
    at -= GAP + 2;
  }
  for (let i = 0; i < parts.full; i += 1) {
    lines += `M0 -${at}L${REACH} -${at + RISE}`;
    at -= GAP;
  }
  if (parts.half) {
    if (parts.full + parts.pennants === 0) at -= GAP;
    lines += `M0 -${at}L${REACH / 2} -${at + RISE / 2}`;
  }
  return { lines, fills };
}
