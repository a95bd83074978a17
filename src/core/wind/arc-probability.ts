import { normalizeDeg } from '../angles';
import { arcWidthDeg, mergeArcs } from '../arcs';
import { normalCdf } from '../erf';
import type { Arc } from '../ground-types';

const STEPS_PER_SIGMA = 256;
const REACH = 6;

/** Standard normal distribution at steps of 1/256; linear between them, within 5e-7. */
const CDF = Float64Array.from({ length: 2 * REACH * STEPS_PER_SIGMA + 2 }, (_, i) =>
  normalCdf(i / STEPS_PER_SIGMA - REACH),
);

/** Standard normal distribution from the table. */
export function tableCdf(z: number): number {
  if (z <= -REACH) return 0;
  if (z >= REACH) return 1;
  const x = (z + REACH) * STEPS_PER_SIGMA;
  const i = x | 0;
  const low = CDF[i] ?? 0;
  return low + ((CDF[i + 1] ?? 1) - low) * (x - i);
}

/** Arcs made ready for many questions: no overlaps, starts and widths. */
export interface ArcTest {
  fromDeg: number[];
  widthDeg: number[];
  coveredDeg: number;
}

export function arcTest(arcs: readonly Arc[]): ArcTest {
  const merged = mergeArcs(arcs);
  const widthDeg = merged.map(arcWidthDeg);
  return { fromDeg: merged.map((a) => a.fromDeg), widthDeg, coveredDeg: widthDeg.reduce((a, b) => a + b, 0) };
}

const EDGE_DEG = 1e-9;

/**
 * Chance (0-1) that a wrapped normal about `meanDeg` lies in the arcs; no direction (null) is uniform; spread 0 is the plain
 * test, ends in. The table makes it good to 1e-5 for spreads to 200 degrees, beyond which it is uniform.
 */
export function chanceInArcs(test: ArcTest, meanDeg: number | null, sigmaDeg: number): number {
  if (meanDeg === null || sigmaDeg > 200) return test.coveredDeg / 360;
  let sum = 0;
  for (let i = 0; i < test.fromDeg.length; i++) {
    const width = test.widthDeg[i] ?? 0;
    if (width >= 360) return 1;
    const start = normalizeDeg((test.fromDeg[i] ?? 0) - meanDeg);
    if (sigmaDeg < 1e-6) {
      const past = normalizeDeg(-start);
      if (past <= width + EDGE_DEG || past >= 360 - EDGE_DEG) return 1;
      continue;
    }
    const turns = Math.ceil((REACH * sigmaDeg) / 360);
    for (let k = -turns; k <= turns; k++) {
      const from = start + 360 * k;
      if (from > REACH * sigmaDeg || from + width < -REACH * sigmaDeg) continue;
      sum += tableCdf((from + width) / sigmaDeg) - tableCdf(from / sigmaDeg);
    }
  }
  return Math.min(sum, 1);
}
