import { z } from 'zod';
import { FEATURE_KINDS } from '@/core/types';
import type { FeatureRow } from './features-data';
import type { FormClub } from './form-club';
import { type DrawnGeometry, geometryText, parseGeometry, SHAPES } from './geometry-text';
import { LINE_MAX, NOTES_MAX, readForm } from './read-form';

/** GeoJSON of the most points kept, with room to spare. */
const PLACES_MAX = 60_000;

export const featureFormSchema = z.object({
  name: z.string().max(LINE_MAX, `Keep it to ${LINE_MAX} characters.`),
  kind: z.enum(FEATURE_KINDS),
  shape: z.enum(SHAPES),
  places: z.string().max(PLACES_MAX, 'That is too long to keep: leave some points out.'),
  /** '1' to '12'. */
  months: z.array(z.string().max(2)).max(12),
  notes: z.string().max(NOTES_MAX, `Keep the notes to ${NOTES_MAX} characters.`),
});
export type FeatureForm = z.output<typeof featureFormSchema>;

/** What a form sets; a table of use typed elsewhere stays as it is. */
export type FeatureFormValues = Pick<FeatureRow, 'name' | 'kind' | 'geometry' | 'months' | 'notes'>;

export function makeFeatureSchema(club: FormClub) {
  return featureFormSchema.transform((typed, ctx): FeatureFormValues => {
    const form = readForm(ctx);
    const name = form.name('name', typed.name);
    const months = [...new Set(typed.months.map(Number))].sort((a, b) => a - b);
    if (months.length === 0) form.fail('months', 'Choose at least one month in which deer use it.');
    if (months.some((m) => !Number.isInteger(m) || m < 1 || m > 12)) form.fail('months', 'Months run from 1 to 12.');
    const parsed = parseGeometry(typed.shape, typed.places, club);
    if (!parsed.ok) {
      form.fail('places', parsed.message);
      return z.NEVER;
    }
    const geometry: DrawnGeometry = parsed.geometry;
    return form.failed() ? z.NEVER : { name, kind: typed.kind, geometry, months, notes: typed.notes.trim() };
  });
}

export const ALL_MONTHS = Array.from({ length: 12 }, (_, i) => String(i + 1));

export function emptyFeatureForm(): FeatureForm {
  return { name: '', kind: 'bedding', shape: 'area', places: '', months: [...ALL_MONTHS], notes: '' };
}

export function featureFormOf(feature: FeatureFormValues): FeatureForm {
  const { shape, text } = geometryText(feature.geometry);
  const { name, kind, notes } = feature;
  return { name, kind, shape, places: text, months: feature.months.map(String), notes };
}
