import { dayOf, formatDay } from '@/core/day-time';
import {
  type DueState,
  dueState,
  type InspectionResult,
  itemsFor,
  type StrapDue,
  strapDue,
  usualNextDue,
} from '@/core/upkeep/inspection';
import { numberText } from '@/features/clubs/read-number';
import { getStand, type StandRow } from '@/features/ground/stands-data';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { firstLine } from './first-line';
import type { InspectionForm } from './inspection-schema';
import { type InspectionDetail, listInspectionsOf } from './inspections-data';
import { ANSWER_WORDS, ITEM_WORDS, RESULT_WORDS, STRAP_WORDS, UPKEEP_TABLE_WORDS as TABLE } from './words/inspections';

export interface UpkeepLine {
  standId: string;
  name: string;
  result: InspectionResult | null;
  resultText: string;
  lastText: string;
  nextText: string;
  nextState: DueState;
  strapText: string;
  strapState: DueState;
}

/** By whose reckoning a strap is good so long. */
export function strapReason(due: StrapDue): string {
  return due.by === 'maker' ? STRAP_WORDS.byMaker(numberText(due.years)) : STRAP_WORDS.usual;
}

function strapText(due: StrapDue | null, today: string): string {
  if (!due) return STRAP_WORDS.noDate;
  const say = dueState(due.lastDay, today) === 'over' ? STRAP_WORDS.over : STRAP_WORDS.good;
  return say(formatDay(due.lastDay, true), strapReason(due));
}

export function upkeepLine(stand: StandRow, last: InspectionDetail | undefined, today: string): UpkeepLine {
  const strap = last ? strapDue({ fittedOn: last.strapFittedOn, makerYears: last.strapYears }) : null;
  const hasStrap = itemsFor(stand.kind).includes('straps');
  return {
    standId: stand.id,
    name: stand.name,
    result: last?.result ?? null,
    resultText: last ? RESULT_WORDS[last.result] : TABLE.never,
    lastText: last ? TABLE.lastBy(formatDay(last.day, true), last.byName) : '–',
    nextText: last ? formatDay(last.nextDueOn, true) : TABLE.now,
    nextState: last ? dueState(last.nextDueOn, today) : 'over',
    strapText: hasStrap ? strapText(strap, today) : TABLE.noStrap,
    strapState: hasStrap && strap ? dueState(strap.lastDay, today) : 'fine',
  };
}

export interface InspectionView {
  id: string;
  dayText: string;
  byName: string;
  result: InspectionResult;
  resultText: string;
  notes: string;
  /** What was not good. */
  found: { label: string; answer: string }[];
}

/** What an inspection has closed and nobody has opened again. */
export interface ClosedBy {
  closureId: string;
  /** Of the inspection, and the first line of its notes. */
  dayText: string;
  reason: string;
}

export interface StandUpkeep {
  line: UpkeepLine;
  history: InspectionView[];
  form: InspectionForm;
  /** An inspection's closure holds, its own or one that stood before. */
  closed: boolean;
  /** null: no inspection has closed the stand itself. */
  closedBy: ClosedBy | null;
}

export async function readStandUpkeep(scope: ClubScope, standId: string, now: number): Promise<StandUpkeep> {
  const stand = await getStand(scope, standId);
  if (!stand) throw notFound();
  const today = dayOf(now, scope.club.zone);
  const rows = await listInspectionsOf(scope, standId);
  const last = rows[0];
  const closing = rows.find((row) => row.closedByIt);
  return {
    line: upkeepLine(stand, last, today),
    history: rows.map((row) => ({
      id: row.id,
      dayText: formatDay(row.day, true),
      byName: row.byName,
      result: row.result,
      resultText: RESULT_WORDS[row.result],
      notes: row.notes,
      found: itemsFor(stand.kind).flatMap((item) => {
        const answer = row.answers[item];
        if (answer !== 'fix' && answer !== 'unsafe') return [];
        return [{ label: ITEM_WORDS[item].label, answer: ANSWER_WORDS[answer] }];
      }),
    })),
    form: {
      standId,
      kind: stand.kind,
      day: today,
      answers: {},
      result: '',
      notes: '',
      strapFittedOn: last?.strapFittedOn ?? '',
      strapYears: numberText(last?.strapYears ?? null),
      nextDueOn: usualNextDue(today),
      reopen: false,
    },
    closed: rows.some((row) => row.closureOpen),
    closedBy: closing?.closureId
      ? { closureId: closing.closureId, dayText: formatDay(closing.day, true), reason: firstLine(closing.notes) }
      : null,
  };
}
