export const CONTOUR_WORDS = {
  reading: 'Reading the ground…',
  said: (of: { interval: number; lowest: number; highest: number; unit: string; source: string }) =>
    `A contour every ${of.interval} ${of.unit}; the ground lies between ${of.lowest} and ${of.highest} ${of.unit}. Heights by ${of.source}.`,
} as const;

export const SLOPE_WORDS = {
  read: 'Read slope and drain off the terrain',
  reading: 'Reading the ground…',
  placeFirst: 'Type the place above first.',
  level: (percent: number) => `Nearly level: ${percent} % slope`,
  slope: (percent: number, sector: string, degrees: number) => `${percent} % slope, draining ${sector} (${degrees}°)`,
  take: 'Take these',
  note: (height: string, source: string) =>
    `At ${height}, by ${source}. Heights this far apart miss small draws and benches: what you know of the ground is better.`,
} as const;

export const HEIGHT_ERRORS = {
  tooMuch: 'That is more ground than heights are asked for at once.',
  noSlope: (problem: string) => `${problem} Type the slope yourself, or try again later.`,
  unknown: 'No heights are known there: type the slope yourself.',
} as const;
