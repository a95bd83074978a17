import { z } from 'zod';
import type { FormClub } from '@/features/ground/form-club';
import { readPlace } from '@/features/ground/place-text';
import { LINE_MAX, NAME_MAX, NOTES_MAX, readForm } from '@/features/ground/read-form';
import { placeOf, type VisitPlace } from '@/features/logs/visit-schema';
import { CHORE_FIELD_ERRORS as ERRORS } from './words/chores';

const line = z.string().max(LINE_MAX, ERRORS.long(LINE_MAX));
const id = z.string().min(1).max(40);

export const choreFormSchema = z.object({
  title: line,
  notes: z.string().trim().max(NOTES_MAX, ERRORS.notes(NOTES_MAX)),
  /** Blank: whoever takes it. */
  assigneeId: line,
  /** 'stand:ID', 'parking:ID', 'feature:ID', 'point', or blank. */
  place: line,
  lat: line,
  lon: line,
  /** Blank: no hurry. */
  dueOn: line,
});
export type ChoreForm = z.output<typeof choreFormSchema>;

export interface ChoreInput {
  title: string;
  notes: string;
  assigneeId: string | null;
  place: VisitPlace | null;
  dueOn: string | null;
}

export function makeChoreSchema(club: FormClub) {
  return choreFormSchema.transform((typed, ctx): ChoreInput => {
    const form = readForm(ctx);
    const title = typed.title.trim().replace(/\s+/g, ' ');
    if (title === '') form.fail('title', ERRORS.title);
    else if (title.length > NAME_MAX * 2) form.fail('title', ERRORS.long(NAME_MAX * 2));
    const dueOn = typed.dueOn.trim() === '' ? null : form.day('dueOn', typed.dueOn);
    const place: VisitPlace | null =
      typed.place === 'point' ? { of: 'point', ...readPlace(form, club, typed) } : placeOf(typed.place);
    if (typed.place !== '' && !place) form.fail('place', ERRORS.place);
    const assigneeId = typed.assigneeId || null;
    return form.failed() ? z.NEVER : { title, notes: typed.notes, assigneeId, place, dueOn };
  });
}

export const EMPTY_CHORE: ChoreForm = { title: '', notes: '', assigneeId: '', place: '', lat: '', lon: '', dueOn: '' };

export const changeChoreFormSchema = choreFormSchema.extend({ id, version: z.int().min(1) });
export type ChangeChoreForm = z.output<typeof changeChoreFormSchema>;

export const choreIdSchema = z.object({ id });

export const finishChoreFormSchema = z.object({ id, doneOn: line, hours: line });
export type FinishChoreForm = z.output<typeof finishChoreFormSchema>;

export interface FinishChoreInput {
  id: string;
  doneOn: string;
  hours: number;
}

export const MOST_HOURS = 24;

export const finishChoreSchema = finishChoreFormSchema.transform((typed, ctx): FinishChoreInput => {
  const form = readForm(ctx);
  const doneOn = form.day('doneOn', typed.doneOn);
  const hours = form.needNumber('hours', typed.hours, { label: ERRORS.hours, min: 0, max: MOST_HOURS, unit: 'h' });
  return form.failed() ? z.NEVER : { id: typed.id, doneOn, hours };
});
