import { type StabilityClass, stabilityOfNumber } from './stability-types';

/** Net radiation index: 4 strong sun to -2 clear night. */
export type NetRadiationIndex = 4 | 3 | 2 | 1 | 0 | -1 | -2;

/** EPA-454/R-99-005 (2000) Table 6-4 after Turner 1964. Columns NRI 4, 3, 2, 1, 0, -1, -2; 1 = A ... 7 = G. */
const TABLE: { toMps: number; numbers: readonly [number, number, number, number, number, number, number] }[] = [
  { toMps: 0.75, numbers: [1, 1, 2, 3, 4, 6, 7] },
  { toMps: 1.85, numbers: [1, 2, 2, 3, 4, 6, 7] },
  { toMps: 2.85, numbers: [1, 2, 3, 4, 4, 5, 6] },
  { toMps: 3.35, numbers: [2, 2, 3, 4, 4, 5, 6] },
  { toMps: 3.85, numbers: [2, 2, 3, 4, 4, 4, 5] },
  { toMps: 4.85, numbers: [2, 3, 3, 4, 4, 4, 5] },
  { toMps: 5.45, numbers: [3, 3, 4, 4, 4, 4, 5] },
  { toMps: 5.95, numbers: [3, 3, 4, 4, 4, 4, 4] },
  { toMps: Number.POSITIVE_INFINITY, numbers: [3, 4, 4, 4, 4, 4, 4] },
];

/** Turner's number 1-7 for a 10 m speed (m/s) and net radiation index. Printed speed bands meet half way between their ends. */
export function turnerNumber(speedMps: number, nri: NetRadiationIndex): number {
  const row = TABLE.find((r) => speedMps < r.toMps) ?? TABLE[TABLE.length - 1];
  return row?.numbers[4 - nri] ?? 4;
}

/** The same as a Pasquill class; 7 is merged into F. */
export function turnerClass(speedMps: number, nri: NetRadiationIndex): StabilityClass {
  return stabilityOfNumber(turnerNumber(speedMps, nri));
}

/** Insolation number by sun altitude in degrees, 1-4. Table 6-5; the lowest row is a value from memory. */
export function insolationNumber(sunAltitudeDeg: number): 1 | 2 | 3 | 4 {
  if (sunAltitudeDeg > 60) return 4;
  if (sunAltitudeDeg > 35) return 3;
  return sunAltitudeDeg > 15 ? 2 : 1;
}

export interface NriInput {
  isNight: boolean;
  sunAltitudeDeg: number;
  /** 0-100. */
  cloudPercent: number;
  /** Height of the cloud base, feet; null: not known. */
  ceilingFt: number | null;
}

const INDEX: Record<number, NetRadiationIndex> = { 1: 1, 2: 2, 3: 3, 4: 4 };

/**
 * Net radiation index from sun and cloud (EPA-454/R-99-005 section 6.4.1, after Turner 1964). Without a ceiling a full
 * cover counts as low and a part cover as middle cloud. The day's cloud corrections are values from memory.
 */
export function netRadiationIndex({ isNight, sunAltitudeDeg, cloudPercent, ceilingFt }: NriInput): NetRadiationIndex {
  const tenths = Math.round(cloudPercent / 10);
  if (tenths >= 10 && (ceilingFt ?? 0) < 7000) return 0;
  if (isNight) return tenths <= 4 ? -2 : -1;
  const sun = insolationNumber(sunAltitudeDeg);
  if (tenths <= 5) return sun;
  const less =
    ceilingFt !== null && ceilingFt < 7000 ? 2 : ceilingFt === null || ceilingFt < 16000 || tenths >= 10 ? 1 : 0;
  return INDEX[Math.max(1, sun - less)] ?? 1;
}
