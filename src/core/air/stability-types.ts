/** Pasquill stability: A very unstable, D neutral, F very stable. */
export const STABILITY_CLASSES = ['A', 'B', 'C', 'D', 'E', 'F'] as const;
export type StabilityClass = (typeof STABILITY_CLASSES)[number];

/** 0 for A to 5 for F. */
export function stabilityIndex(c: StabilityClass): number {
  return STABILITY_CLASSES.indexOf(c);
}

/** Class of a number from 1 (A); 7 and above are merged into F, as EPA-454/R-99-005 section 6.4.1 does. */
export function stabilityOfNumber(n: number): StabilityClass {
  return STABILITY_CLASSES[Math.max(0, Math.min(5, Math.round(n) - 1))] ?? 'D';
}
