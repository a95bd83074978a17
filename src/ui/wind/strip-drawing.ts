import { BIN_COUNT, BIN_DEG } from './strip-shares';

/** Steps of shading. Few, so that a row is a handful of paths and not 72 boxes. */
const LEVELS = 8;
const DARKEST = 0.92;
/** A bin this many times as full as in an even spread is drawn at full strength: about a spread of 15 degrees. */
const FULL_DENSITY = 10;

/** Shading level 0 (none) to 8 of one bin's share, on one scale for every strip so that sure and unsure look different. */
export function shadeLevel(share: number): number {
  const density = share * BIN_COUNT;
  if (!(density > 0.15)) return 0;
  return Math.max(1, Math.round(LEVELS * Math.min(1, (density / FULL_DENSITY) ** 0.7)));
}

export function levelOpacity(level: number): number {
  return Math.round((DARKEST * level * 100) / LEVELS) / 100;
}

export interface ShadePath {
  level: number;
  opacity: number;
  d: string;
}

/** Boxes of a shaded row, one path a level; bins of one level that touch are one box. `xOf` maps degrees to x. */
export function shadePaths(
  shares: readonly number[],
  xOf: (deg: number) => number,
  y: number,
  height: number,
): ShadePath[] {
  const byLevel = new Map<number, string>();
  let start = 0;
  while (start < shares.length) {
    const level = shadeLevel(shares[start] ?? 0);
    let end = start + 1;
    while (end < shares.length && shadeLevel(shares[end] ?? 0) === level) end += 1;
    if (level > 0) {
      const x = round(xOf(start * BIN_DEG));
      const box = `M${x} ${y}H${round(xOf(end * BIN_DEG))}v${height}H${x}z`;
      byLevel.set(level, (byLevel.get(level) ?? '') + box);
    }
    start = end;
  }
  return [...byLevel].map(([level, d]) => ({ level, opacity: levelOpacity(level), d }));
}

export function round(value: number): number {
  return Math.round(value * 100) / 100;
}
