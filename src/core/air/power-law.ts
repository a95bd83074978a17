import { type StabilityClass, stabilityIndex } from './stability-types';

/** EPA-454/R-99-005 section 6.2.5 rural exponents, A to F (basis Irwin 1979, Atmos. Environ. 13:191-194). */
export const RURAL_EXPONENTS = [0.07, 0.07, 0.1, 0.15, 0.35, 0.55] as const;

/** Wind at height z (m) as a share of wind at 10 m. Heights below 0.5 m count as 0.5 m. */
export function heightShare(c: StabilityClass, heightM: number): number {
  return (Math.max(0.5, heightM) / 10) ** (RURAL_EXPONENTS[stabilityIndex(c)] ?? 0.15);
}
