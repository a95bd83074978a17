import { arcWidthDeg } from '@/core/arcs';
import type { WindowName } from '@/core/condition-types';
import type { Arc, GoodWindArc } from '@/core/ground-types';
import { parseArcs } from '@/core/parse-arcs';
import { SECTORS } from '@/core/sectors';
import { numberText } from '@/features/clubs/read-number';
import { TYPED_FIELD_ERRORS } from './words/field-errors';

/** Form fields for good winds, and the window each stands for. */
export const ARC_FIELDS = [
  { name: 'arcsBoth', window: null },
  { name: 'arcsMorning', window: 'morning' },
  { name: 'arcsEvening', window: 'evening' },
] as const;
export type ArcField = (typeof ARC_FIELDS)[number]['name'];

const MOST_ARCS = 24;

export type ReadArcs = { ok: true; arcs: GoodWindArc[] } | { ok: false; message: string };

/** Good-wind arcs of one window (null: both) from what a person types. */
export function readArcs(text: string, window: WindowName | null): ReadArcs {
  const parsed = parseArcs(text);
  if (!parsed.ok) return parsed;
  if (parsed.arcs.length > MOST_ARCS) return { ok: false, message: TYPED_FIELD_ERRORS.mostWinds(MOST_ARCS) };
  return { ok: true, arcs: parsed.arcs.map((arc) => ({ ...arc, window })) };
}

function spanText(arc: Arc): string {
  if (arcWidthDeg(arc) === 360) return 'any';
  const from = SECTORS.find((s) => s.lowerDeg === arc.fromDeg);
  const to = SECTORS.find((s) => s.upperDeg === arc.toDeg);
  if (from && to) return from === to ? from.name : `${from.name}-${to.name}`;
  return `${numberText(arc.fromDeg)}-${numberText(arc.toDeg)}`;
}

/** What a form shows of a stand's arcs of one window: readArcs gives the same arcs back. */
export function arcText(arcs: readonly GoodWindArc[], window: WindowName | null): string {
  return arcs
    .filter((arc) => arc.window === window)
    .map(spanText)
    .join(', ');
}
