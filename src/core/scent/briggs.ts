import { type StabilityClass, stabilityIndex } from '../air/stability-types';

/**
 * Briggs 1973 open-country curves (ATDL Contribution 79, doi:10.2172/5118833; printed in Boubel et al. 1994, Table 19-7).
 * Stated for 100-10,000 m; nearer than that they are an index.
 */
const SIGMA_Y = [0.22, 0.16, 0.11, 0.08, 0.06, 0.04] as const;

/** Crosswind spread of a plume at x metres downwind, m. */
export function briggsSigmaY(c: StabilityClass, xM: number): number {
  return ((SIGMA_Y[stabilityIndex(c)] ?? 0.08) * xM) / Math.sqrt(1 + 0.0001 * xM);
}

/** Vertical spread of a plume at x metres downwind, m. */
export function briggsSigmaZ(c: StabilityClass, xM: number): number {
  switch (c) {
    case 'A':
      return 0.2 * xM;
    case 'B':
      return 0.12 * xM;
    case 'C':
      return (0.08 * xM) / Math.sqrt(1 + 0.0002 * xM);
    case 'D':
      return (0.06 * xM) / Math.sqrt(1 + 0.0015 * xM);
    case 'E':
      return (0.03 * xM) / (1 + 0.0003 * xM);
    case 'F':
      return (0.016 * xM) / (1 + 0.0003 * xM);
  }
}
