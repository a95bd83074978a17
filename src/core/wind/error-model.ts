import type { SpeedPoint, WindSettings } from '../settings';

const RAD = Math.PI / 180;

/** A value at a speed from a table in order of speed; ends are held. */
export function atSpeed(table: SpeedPoint[], speedMps: number): number {
  const first = table[0];
  if (!first) return 0;
  let last = first;
  for (const point of table) {
    if (point.speedMps >= speedMps) {
      const width = point.speedMps - last.speedMps;
      return width > 0 ? last.deg + ((point.deg - last.deg) * (speedMps - last.speedMps)) / width : point.deg;
    }
    last = point;
  }
  return last.deg;
}

/**
 * Standard deviation of forecast direction against an observation, degrees (0 and up): by 10 m speed, growing with lead.
 * 180 is uniform for every purpose. Lead below a day counts as a day.
 */
export function directionErrorDeg(speedMps: number, leadHours: number, s: WindSettings): number {
  const base = atSpeed(s.errorBySpeed, Math.max(0, speedMps));
  const days = Math.max(0, (leadHours - 24) / 24);
  return Math.min(Math.max(s.errorCapDeg, base), base + s.errorPerLeadDayDeg * days);
}

/** Spread after a share of the moment is given over to a variable wind: the mean resultant length falls by that share. */
export function widenByVariable(sigmaDeg: number, variableShare: number): number {
  if (!(variableShare > 0)) return sigmaDeg;
  const r = (1 - Math.min(1, variableShare)) * Math.exp(-((sigmaDeg * RAD) ** 2) / 2);
  return r < 0.005 ? 187 : Math.sqrt(-2 * Math.log(r)) / RAD;
}

export interface Nodes {
  z: number[];
  weights: number[];
  /** Distance between neighbours, in standard deviations. */
  spacing: number;
}

const REACH = 2.9;

/** `count` evenly spaced points of a standard normal with weights that sum to 1, mean 0 and variance exactly 1. */
export function normalNodes(count: number): Nodes {
  const n = Math.max(1, Math.round(count));
  if (n === 1) return { z: [0], weights: [1], spacing: 0 };
  const step = (2 * REACH) / n;
  const raw = Array.from({ length: n }, (_, i) => (i - (n - 1) / 2) * step);
  const mass = raw.map((z) => Math.exp((-z * z) / 2));
  const total = mass.reduce((a, b) => a + b, 0);
  const weights = mass.map((m) => m / total);
  const sd = Math.sqrt(raw.reduce((sum, z, i) => sum + z * z * (weights[i] ?? 0), 0));
  return { z: raw.map((z) => z / sd), weights, spacing: step / sd };
}
