import { MONTHS } from '@/core/day-time';
import type { FeatureKind, ShelterClass, ShotSide, StandKind, Suitability, Weapon } from '@/core/ground-types';

export const STAND_KIND_WORDS: Record<StandKind, string> = {
  ladder: 'Ladder stand',
  hang_on: 'Hang-on',
  climber: 'Climber tree',
  tripod: 'Tripod',
  box_blind: 'Box blind',
  ground_blind: 'Ground blind',
  natural_cover: 'Natural cover',
};

export const FEATURE_KIND_WORDS: Record<FeatureKind, string> = {
  bedding: 'Bedding',
  food_plot: 'Food plot',
  crop: 'Crop',
  mast: 'Mast trees',
  water: 'Water',
  scrape: 'Scrape',
  rub_line: 'Rub line',
  travel_line: 'Travel line',
  crossing: 'Crossing',
  sanctuary: 'Sanctuary',
};

export const SHELTER_WORDS: Record<ShelterClass, string> = {
  open: 'Open ground',
  edge: 'Edge of wood or field',
  open_wood: 'Open wood',
  dense_wood: 'Dense wood',
};

export const SUITABILITY_WORDS: Record<Suitability, string> = { prime: 'Prime', usable: 'Usable', avoid: 'Avoid' };

export const WEAPON_WORDS: Record<Weapon, string> = {
  bow: 'Bow',
  crossbow: 'Crossbow',
  muzzleloader: 'Muzzleloader',
  shotgun: 'Shotgun',
  rifle: 'Rifle',
};

export const SHOT_SIDE_WORDS: Record<ShotSide, string> = {
  left: 'Left of the way it faces',
  right: 'Right of the way it faces',
  either: 'Either side',
};

export const DIRECTION_WORDS = { in: 'In', out: 'Out', both: 'In and out' } as const;

export const SHAPE_WORDS = { point: 'Point', line: 'Line', area: 'Area' } as const;

export const MONTH_CHOICES = MONTHS.map((label, i) => ({ value: String(i + 1), label }));

/** Months as runs that may cross the new year: 'Sep–Jan', 'Mar, Oct–Nov'; all twelve are 'All year'. */
export function formatMonths(months: readonly number[]): string {
  const used = new Set(months);
  if (used.size === 12) return 'All year';
  const word = (month: number) => MONTHS[(month - 1) % 12] ?? '';
  const starts = [...used].filter((m) => !used.has(m === 1 ? 12 : m - 1)).sort((a, b) => a - b);
  return starts
    .map((start) => {
      let end = start;
      while (used.has((end % 12) + 1)) end += 1;
      return end === start ? word(start) : `${word(start)}–${word(end)}`;
    })
    .join(', ');
}

/** In place of good winds that nobody has set. */
export const NONE_SET = 'None set';
