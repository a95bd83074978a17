import { normalizeDeg } from './angles';

export const SECTOR_NAMES = [
  'N',
  'NNE',
  'NE',
  'ENE',
  'E',
  'ESE',
  'SE',
  'SSE',
  'S',
  'SSW',
  'SW',
  'WSW',
  'W',
  'WNW',
  'NW',
  'NNW',
] as const;
export type SectorName = (typeof SECTOR_NAMES)[number];

export const SECTOR_WIDTH_DEG = 22.5;
const HALF = SECTOR_WIDTH_DEG / 2;

/** One of the 16 compass points; bounds are where its sector starts (held) and ends (the next one's). */
export interface Sector {
  index: number;
  name: SectorName;
  centreDeg: number;
  lowerDeg: number;
  upperDeg: number;
}

export const SECTORS: readonly Sector[] = SECTOR_NAMES.map((name, index) => ({
  index,
  name,
  centreDeg: index * SECTOR_WIDTH_DEG,
  lowerDeg: normalizeDeg(index * SECTOR_WIDTH_DEG - HALF),
  upperDeg: normalizeDeg(index * SECTOR_WIDTH_DEG + HALF),
}));

/** Index 0-15 of the sector that holds a direction. A bound belongs to the sector it begins: 11.25 is NNE, 348.75 is N. */
export function sectorOf(deg: number): number {
  return Math.floor((normalizeDeg(deg) + HALF) / SECTOR_WIDTH_DEG) % 16;
}

/** Name of the sector that holds a direction: 315 -> 'NW'. */
export function sectorName(deg: number): SectorName {
  return SECTOR_NAMES[sectorOf(deg)] ?? 'N';
}

const WORDS: Record<string, SectorName> = {
  NORTH: 'N',
  NORTHEAST: 'NE',
  EAST: 'E',
  SOUTHEAST: 'SE',
  SOUTH: 'S',
  SOUTHWEST: 'SW',
  WEST: 'W',
  NORTHWEST: 'NW',
};

/** The sector a person means by 'nw', 'NNE' or 'northwest'; null when it names none. */
export function findSector(text: string): Sector | null {
  const upper = text.trim().toUpperCase();
  const name = WORDS[upper] ?? upper;
  return SECTORS.find((s) => s.name === name) ?? null;
}
