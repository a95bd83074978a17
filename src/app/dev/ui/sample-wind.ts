import { wrappedNormalInArc } from '@/core/circular';
import { BIN_COUNT, BIN_DEG, shareInArcs } from '@/ui/wind/strip-shares';

/** Invented weather for showing the parts. */
export const START = Date.UTC(2026, 10, 7, 10, 30);
export const ARCS = [{ fromDeg: 292.5, toDeg: 11.25 }];
export const TWO_ARCS = [
  { fromDeg: 33.75, toDeg: 101.25 },
  { fromDeg: 191.25, toDeg: 213.75 },
];

export function sharesAbout(meanDeg: number, sigmaDeg: number): number[] {
  return Array.from({ length: BIN_COUNT }, (_, bin) =>
    wrappedNormalInArc(meanDeg, sigmaDeg, { fromDeg: bin * BIN_DEG, toDeg: (bin + 1) * BIN_DEG }),
  );
}

export const ROWS = [318, 322, 330, 345, 4, 22, 41].map((mean, hour) => ({
  at: START + hour * 1_800_000,
  shares: sharesAbout(mean, 14 + hour * 4),
}));

export const STEPS = ROWS.map((row, step) => ({
  at: row.at,
  arcHold: shareInArcs(row.shares, ARCS),
  windedChance: [0.03, 0.03, 0.05, 0.08, 0.16, 0.27, 0.38][step] ?? null,
  sunInEyes: step === 3 || step === 4,
  precipMm: step === 6 ? 0.8 : 0,
  note: step === 2 ? 'first hour of sun' : null,
}));

export function clock(at: number): string {
  return new Date(at - 5 * 3_600_000).toISOString().slice(11, 16).replace(/^0/, '');
}
