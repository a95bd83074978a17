import { SECTOR_WIDTH_DEG, SECTORS } from '@/core/sectors';
import { ROSE_WORDS } from '../words/wind';
import { BIN_DEG, percent } from './strip-shares';

/** 72 bins of 5 degrees gathered into the 16 compass points; a bin cut by a sector's bound is split by width. */
export function gatherSectors(shares: readonly number[]): number[] {
  const sums = SECTORS.map(() => 0);
  shares.forEach((share, bin) => {
    for (let part = 0; part < 4; part += 1) {
      // Bounds lie at odd multiples of 11.25 degrees: quarters of a bin never straddle one.
      const deg = (bin + (part + 0.5) / 4) * BIN_DEG;
      const sector = Math.floor((deg + SECTOR_WIDTH_DEG / 2) / SECTOR_WIDTH_DEG) % 16;
      sums[sector] = (sums[sector] ?? 0) + share / 4;
    }
  });
  return sums;
}

/** The rose in words, fullest first: 'Wind from NW 32 %, N 20 %; calm 6 %'. */
export function describeRose(sectorShares: readonly number[], calmShare = 0): string {
  const told = SECTORS.map(({ name, index }) => ({ name, share: sectorShares[index] ?? 0 }))
    .filter(({ share }) => share >= 0.005)
    .sort((a, b) => b.share - a.share);
  const calm = calmShare >= 0.005 ? percent(calmShare) : null;
  if (told.length === 0) return calm ? ROSE_WORDS.calm(calm) : ROSE_WORDS.none;
  return ROSE_WORDS.from(told.map(({ name, share }) => `${name} ${percent(share)}`).join(', '), calm);
}

/** Step between a rose's rings so that two to four are drawn up to the fullest petal. */
export function ringStep(fullest: number): number {
  return [0.02, 0.05, 0.1, 0.2].find((step) => fullest / step <= 4) ?? 0.25;
}
