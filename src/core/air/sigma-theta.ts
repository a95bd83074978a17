import { type StabilityClass, stabilityIndex } from './stability-types';

/** NOAA Air Resources Laboratory (READY), after NRC Regulatory Guide 1.23: degrees, A to F. */
const TYPICAL_DEG = [25, 20, 15, 10, 5, 2.5] as const;

/** EPA-454/R-99-005 Table 6-9a, lower bounds of lateral sigma-theta, A to E (values from memory). */
const LOWER_DEG = [22.5, 17.5, 12.5, 7.5, 3.8] as const;

/** Typical standard deviation of wind direction within the hour, degrees. */
export function sigmaThetaDeg(c: StabilityClass): number {
  return TYPICAL_DEG[stabilityIndex(c)] ?? 10;
}

/** First-guess class of a measured sigma-theta in degrees, before EPA's night correction. */
export function classOfSigmaTheta(deg: number): StabilityClass {
  const classes: StabilityClass[] = ['A', 'B', 'C', 'D', 'E'];
  return classes.find((_, i) => deg >= (LOWER_DEG[i] ?? 0)) ?? 'F';
}
