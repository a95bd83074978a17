import { z } from 'zod';
import { STAND_KINDS } from '@/core/ground-types';
import {
  INSPECTION_ITEMS,
  INSPECTION_RESULTS,
  type InspectionAnswers,
  type InspectionResult,
  ITEM_ANSWERS,
  itemsFor,
  mildestResult,
  resultFits,
} from '@/core/upkeep/inspection';
import { LINE_MAX, NOTES_MAX, readForm } from '@/features/ground/read-form';
import { INSPECTION_FIELD_ERRORS as ERRORS } from './words/inspections';

const line = z.string().max(LINE_MAX, ERRORS.long(LINE_MAX));

export const inspectionFormSchema = z.object({
  standId: z.string().min(1).max(40),
  /** The stand's kind when the form was made: it decides what is on the list. */
  kind: z.enum(STAND_KINDS),
  day: line,
  /** '' : not answered yet. */
  answers: z.partialRecord(z.enum(INSPECTION_ITEMS), z.enum(['', ...ITEM_ANSWERS]).nullish()),
  result: z.enum(['', ...INSPECTION_RESULTS]).nullish(),
  notes: z.string().trim().max(NOTES_MAX, ERRORS.notesLong(NOTES_MAX)),
  strapFittedOn: line,
  strapYears: line,
  nextDueOn: line,
  /** Of a pass: opens what an inspection closed. */
  reopen: z.boolean(),
});
export type InspectionForm = z.output<typeof inspectionFormSchema>;

export interface InspectionInput {
  standId: string;
  day: string;
  answers: InspectionAnswers;
  result: InspectionResult;
  notes: string;
  strapFittedOn: string | null;
  strapYears: number | null;
  nextDueOn: string;
  reopen: boolean;
}

export const inspectionSchema = inspectionFormSchema.transform((typed, ctx): InspectionInput => {
  const form = readForm(ctx);
  const answers: InspectionAnswers = {};
  for (const item of itemsFor(typed.kind)) {
    const answer = typed.answers[item];
    if (answer) answers[item] = answer;
    else form.fail(`answers.${item}`, ERRORS.answer);
  }
  const day = form.day('day', typed.day);
  const nextDueOn = form.day('nextDueOn', typed.nextDueOn);
  if (!form.failed() && nextDueOn <= day) form.fail('nextDueOn', ERRORS.next);
  const strapFittedOn = typed.strapFittedOn.trim() === '' ? null : form.day('strapFittedOn', typed.strapFittedOn);
  if (strapFittedOn !== null && !form.failed() && strapFittedOn > day) {
    form.fail('strapFittedOn', ERRORS.strap);
  }
  const strapYears = form.number('strapYears', typed.strapYears, { label: ERRORS.years, min: 0.25, max: 20 });
  const result = typed.result || null;
  if (result === null) form.fail('result', ERRORS.result);
  else if (!resultFits(result, answers)) form.fail('result', ERRORS.tooMild[mildestResult(answers)]);
  if (result !== null && result !== 'pass' && typed.notes === '') form.fail('notes', ERRORS.notes);
  if (form.failed() || result === null) return z.NEVER;
  const { standId, notes } = typed;
  const reopen = typed.reopen && result === 'pass';
  return { standId, day, answers, result, notes, strapFittedOn, strapYears, nextDueOn, reopen };
});
