import type { DrawnShape } from '@/core/map-layers';
import { kindGroups, type NewKind, shapesOf } from '@/features/map/drawing/kinds';

const EVERYTHING = kindGroups({ stands: true, features: true, approaches: true });
const BY_VALUE = new Map(EVERYTHING.flatMap((group) => group.kinds).map((one) => [one.value, one]));

/** 'stand:ladder', 'parking', 'approach', 'feature:bedding', 'item:wood'; null for anything else. */
export function kindOf(value: string): NewKind | null {
  return BY_VALUE.get(value)?.kind ?? null;
}

export function kindLabel(value: string): string {
  return BY_VALUE.get(value)?.label ?? '';
}

export function fitsShape(value: string, shape: DrawnShape): boolean {
  const kind = kindOf(value);
  return kind !== null && shapesOf(kind).includes(shape);
}

export interface KindChoices {
  label: string;
  options: { value: string; label: string }[];
}

/** What a shape may be taken as, under the headings of the map's own list. */
export function choicesFor(shape: DrawnShape): KindChoices[] {
  return EVERYTHING.map(({ label, kinds }) => ({
    label,
    options: kinds
      .filter(({ kind }) => shapesOf(kind).includes(shape))
      .map(({ value, label: word }) => ({ value, label: word })),
  })).filter(({ options }) => options.length > 0);
}
