import { z } from 'zod';
import { isDay } from '@/core/day-time';
import { CLUB_FIELD_ERRORS } from './words/field-errors';

/** Blank is no filter: a form sent by GET names every field. */
const optional = (most: number) =>
  z
    .string()
    .trim()
    .max(most, CLUB_FIELD_ERRORS.long(most))
    .optional()
    .transform((text) => text || null);

const day = optional(20).refine((text) => text === null || isDay(text), CLUB_FIELD_ERRORS.day);

/** What of the audit log is asked for: the page's address and the file's. */
export const auditFilterSchema = z
  .object({ person: optional(60), action: optional(60), from: day, to: day, text: optional(100) })
  .refine(({ from, to }) => from === null || to === null || from <= to, {
    error: CLUB_FIELD_ERRORS.daysOrder,
    path: ['to'],
  });
export type AuditFilter = z.output<typeof auditFilterSchema>;

/** The filter as a part of an address. */
export function auditSearch(filter: AuditFilter, page?: number): string {
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(filter)) if (value !== null) search.set(key, value);
  if (page !== undefined && page > 1) search.set('page', String(page));
  const text = search.toString();
  return text === '' ? '' : `?${text}`;
}
