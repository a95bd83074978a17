import { z } from 'zod';
import { daysBetween, isDay } from '@/core/day-time';
import type { ClosureValues } from './closures-data';
import { LINE_MAX, readForm } from './read-form';

const MOST_DAYS = 400;

const line = z.string().max(LINE_MAX, `Keep it to ${LINE_MAX} characters.`);

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
  if (standId === null && open) form.fail('toDay', 'Choose the last closed day of the ground.');
  if (toDay !== null && isDay(fromDay) && isDay(toDay)) {
    if (toDay < fromDay) form.fail('toDay', 'The last day comes before the first.');
    else if (daysBetween(fromDay, toDay) >= MOST_DAYS) form.fail('toDay', `Close at most ${MOST_DAYS} days at a time.`);
  }
  // Screens set the full stop themselves.
  const reason = typed.reason.trim().replace(/\.+$/, '');
  if (reason === '') form.fail('reason', 'Say why: members read it.');
  return form.failed() ? z.NEVER : { standId, fromDay, toDay, reason };
});
