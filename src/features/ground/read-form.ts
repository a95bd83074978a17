import type { z } from 'zod';
import { isDay } from '@/core/day-time';
import { formReader } from '@/features/clubs/read-number';
import { FIELD_ERRORS } from './words/errors';

/** Most characters a form's one-line and long fields are taken with at all. */
export const LINE_MAX = 200;
export const NOTES_MAX = 2000;
export const NAME_MAX = 60;

/** Reads a form's text field by field and sets what is wrong beside each; nothing stops at the first mistake. */
export function readForm(ctx: z.RefinementCtx) {
  const form = formReader(ctx);
  return {
    ...form,
    name(path: string, text: string): string {
      const name = text.trim().replace(/\s+/g, ' ');
      if (name === '') form.fail(path, FIELD_ERRORS.name);
      else if (name.length > NAME_MAX) form.fail(path, FIELD_ERRORS.nameLong(NAME_MAX));
      return name;
    },
    day(path: string, text: string): string {
      if (!isDay(text.trim())) form.fail(path, FIELD_ERRORS.day);
      return text.trim();
    },
  };
}

export type FormReader = ReturnType<typeof readForm>;
