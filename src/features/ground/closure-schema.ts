import { z } from 'zod';
import { daysBetween, isDay } from '@/core/day-time';
import type { ClosureValues } from './closures-data';
import { LINE_MAX, readForm } from './read-form';
import { CLOSURE_FIELD_ERRORS } from './words/field-errors';

const MOST_DAYS = 400;

const line = z.string().max(LINE_MAX, CLOSURE_FIELD_ERRORS.long(LINE_MAX));

export const closureFormSchema = z.object({
  /** Blank: the whole ground. */
  standId: line,
  fromDay: line,
  /** Blank: until opened again; only for a stand. */
  toDay: line,
  reason: line,
});
export type ClosureForm = z.output<typeof closureFormSchema>;

export const closureSchema = closureFormSchema.transform((typed, ctx): ClosureValues => {
  const form = readForm(ctx);
  const standId = typed.standId || null;
  const fromDay = form.day('fromDay', typed.fromDay);
  const open = typed.toDay.trim() === '';
  const toDay = open ? null : form.day('toDay', typed.toDay);
  if (standId === null && open) form.fail('toDay', CLOSURE_FIELD_ERRORS.lastDay);
  if (toDay !== null && isDay(fromDay) && isDay(toDay)) {
    if (toDay < fromDay) form.fail('toDay', CLOSURE_FIELD_ERRORS.daysOrder);
    else if (daysBetween(fromDay, toDay) >= MOST_DAYS) form.fail('toDay', CLOSURE_FIELD_ERRORS.mostDays(MOST_DAYS));
  }
  // Screens set the full stop themselves.
  const reason = typed.reason.trim().replace(/\.+$/, '');
  if (reason === '') form.fail('reason', CLOSURE_FIELD_ERRORS.reason);
  return form.failed() ? z.NEVER : { standId, fromDay, toDay, reason };
});
