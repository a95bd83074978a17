import { addDays, daysBetween } from '../day-time';
import type { StandKind } from '../ground-types';

export const INSPECTION_RESULTS = ['pass', 'fix_first', 'closed'] as const;
export type InspectionResult = (typeof INSPECTION_RESULTS)[number];

export const ITEM_ANSWERS = ['good', 'fix', 'unsafe', 'none'] as const;
/** none: the stand has no such thing. */
export type ItemAnswer = (typeof ITEM_ANSWERS)[number];

export const INSPECTION_ITEMS = [
  'tree',
  'straps',
  'ratchets',
  'bolts',
  'seat',
  'ladder',
  'platform',
  'lifeline',
  'steps',
  'blind',
  'noise',
  'name_tag',
  'lanes',
  'path',
  'weight_label',
  'haul_rope',
] as const;
export type InspectionItem = (typeof INSPECTION_ITEMS)[number];
export type InspectionAnswers = Partial<Record<InspectionItem, ItemAnswer>>;

const EVERY_STAND: readonly InspectionItem[] = ['seat', 'noise', 'name_tag', 'lanes', 'path'];
const IN_A_TREE: readonly InspectionItem[] = ['tree', 'straps', 'ratchets', 'bolts', 'platform', 'lifeline'];
const RAISED: readonly InspectionItem[] = ['weight_label', 'haul_rope'];

const BY_KIND: Record<StandKind, readonly InspectionItem[]> = {
  ladder: [...IN_A_TREE, ...RAISED, 'ladder'],
  hang_on: [...IN_A_TREE, ...RAISED, 'steps'],
  climber: [...IN_A_TREE, ...RAISED],
  tripod: ['bolts', 'ladder', 'platform', 'lifeline', ...RAISED],
  box_blind: ['bolts', 'ladder', 'steps', 'platform', 'blind', ...RAISED],
  ground_blind: ['blind'],
  natural_cover: [],
};

/** What is looked at for a kind of stand, in the order of the list. Kept per stand as clubs do (common practice). */
export function itemsFor(kind: StandKind): InspectionItem[] {
  const wanted = new Set([...EVERY_STAND, ...BY_KIND[kind]]);
  return INSPECTION_ITEMS.filter((item) => wanted.has(item));
}

/** The mildest result the answers leave open: something unsafe closes the stand, something to mend never passes it. */
export function mildestResult(answers: InspectionAnswers): InspectionResult {
  const given = Object.values(answers);
  if (given.includes('unsafe')) return 'closed';
  return given.includes('fix') ? 'fix_first' : 'pass';
}

/** Whether a result is at least as strict as the answers ask for. */
export function resultFits(result: InspectionResult, answers: InspectionAnswers): boolean {
  return INSPECTION_RESULTS.indexOf(result) >= INSPECTION_RESULTS.indexOf(mildestResult(answers));
}

/** Two years on a main strap is common practice, no standard: the maker's instructions override it. */
export const USUAL_STRAP_YEARS = 2;
/** How long before its day a strap or an inspection is spoken of. Our choice. */
export const SOON_DAYS = 30;

export interface StrapDue {
  /** Last day of its time, YYYY-MM-DD. */
  lastDay: string;
  years: number;
  by: 'maker' | 'practice';
}

/** When a strap's time is over: the maker's years (parts of a year allowed) or else the usual two; null without its date. */
export function strapDue(strap: { fittedOn: string | null; makerYears: number | null }): StrapDue | null {
  if (strap.fittedOn === null) return null;
  const years = strap.makerYears ?? USUAL_STRAP_YEARS;
  const whole = Math.floor(years);
  const sameDay = `${String(Number(strap.fittedOn.slice(0, 4)) + whole).padStart(4, '0')}${strap.fittedOn.slice(4)}`;
  // 29 February has its year's day on the 28th.
  const day = sameDay.endsWith('-02-29') ? lastOfFebruary(sameDay) : sameDay;
  const lastDay = addDays(day, Math.round((years - whole) * 365));
  return { lastDay, years, by: strap.makerYears === null ? 'practice' : 'maker' };
}

function lastOfFebruary(day: string): string {
  return addDays(`${day.slice(0, 4)}-03-01`, -1);
}

export type DueState = 'fine' | 'soon' | 'over';

/** How a last day stands on a day: over from the day after it. */
export function dueState(lastDay: string, today: string): DueState {
  const left = daysBetween(today, lastDay);
  if (left < 0) return 'over';
  return left <= SOON_DAYS ? 'soon' : 'fine';
}

/** The usual next look: a year on. The club's own date stands in its place. */
export function usualNextDue(day: string): string {
  return addDays(day, 365);
}
