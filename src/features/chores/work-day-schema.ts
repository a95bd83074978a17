import { z } from 'zod';
import { isClock } from '@/core/day-time';
import { LINE_MAX, NAME_MAX, NOTES_MAX, readForm } from '@/features/ground/read-form';
import { MOST_HOURS } from './chore-schema';
import { WORK_DAY_FIELD_ERRORS as ERRORS, NEW_WORK_DAY } from './words/work-days';

const line = z.string().max(LINE_MAX, ERRORS.long(LINE_MAX));
const id = z.string().min(1).max(40);

export const workDayFormSchema = z.object({
  title: line,
  day: line,
  startClock: line,
  endClock: line,
  meet: line,
  notes: z.string().trim().max(NOTES_MAX, ERRORS.notes(NOTES_MAX)),
});
export type WorkDayForm = z.output<typeof workDayFormSchema>;

export type WorkDayInput = WorkDayForm;

function readWorkDay(typed: WorkDayForm, ctx: z.RefinementCtx): WorkDayInput {
  const form = readForm(ctx);
  const title = typed.title.trim().replace(/\s+/g, ' ');
  if (title === '') form.fail('title', ERRORS.name);
  else if (title.length > NAME_MAX) form.fail('title', ERRORS.nameLong(NAME_MAX));
  const day = form.day('day', typed.day);
  const [startClock, endClock] = [typed.startClock.trim(), typed.endClock.trim()];
  if (!isClock(startClock)) form.fail('startClock', ERRORS.time);
  if (!isClock(endClock)) form.fail('endClock', ERRORS.time);
  else if (endClock <= startClock) form.fail('endClock', ERRORS.endFirst);
  const { meet, notes } = typed;
  return form.failed() ? z.NEVER : { title, day, startClock, endClock, meet: meet.trim(), notes };
}

export const workDaySchema = workDayFormSchema.transform(readWorkDay);

export const changeWorkDayFormSchema = workDayFormSchema.extend({ id, sequence: z.int().min(0) });
export const changeWorkDaySchema = changeWorkDayFormSchema.transform((typed, ctx) => ({
  ...readWorkDay(typed, ctx),
  id: typed.id,
  sequence: typed.sequence,
}));
export type ChangeWorkDayForm = z.output<typeof changeWorkDayFormSchema>;

export const EMPTY_WORK_DAY: WorkDayForm = {
  title: NEW_WORK_DAY,
  day: '',
  startClock: '08:00',
  endClock: '12:00',
  meet: '',
  notes: '',
};

export const workDayIdSchema = z.object({ id });
export const joinWorkDaySchema = z.object({ id, comes: z.boolean() });

export const creditFormSchema = z.object({
  id,
  /** Hours as typed; blank: was not there. */
  members: z.array(z.object({ memberId: id, hours: line })).max(500),
});
export type CreditForm = z.output<typeof creditFormSchema>;

export interface CreditInput {
  id: string;
  members: { memberId: string; hours: number | null }[];
}

export const creditSchema = creditFormSchema.transform((typed, ctx): CreditInput => {
  const form = readForm(ctx);
  const rule = { label: ERRORS.hours, min: 0, max: MOST_HOURS, unit: 'h' };
  const members = typed.members.map(({ memberId, hours }, index) => ({
    memberId,
    hours: form.number(`members.${index}.hours`, hours, rule),
  }));
  return form.failed() ? z.NEVER : { id: typed.id, members };
});
