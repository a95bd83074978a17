import { z } from 'zod';
import { FEATURE_KINDS, TIMES_OF_DAY, type UseTable } from '@/core/ground-types';
import type { CropYear } from '@/core/map-layers';
import { numberText } from '@/features/clubs/read-number';
import type { FeatureRow } from './features-data';
import type { FormClub } from './form-club';
import { type DrawnGeometry, geometryText, parseGeometry, SHAPES } from './geometry-text';
import { type FormReader, LINE_MAX, NOTES_MAX, readForm } from './read-form';
import { FEATURE_FIELD_ERRORS } from './words/field-errors';

/** GeoJSON of the most points kept, with room to spare. */
const PLACES_MAX = 60_000;

const MOST_CROPS = 20;
const line = z.string().max(LINE_MAX, FEATURE_FIELD_ERRORS.long(LINE_MAX));
const NO_USE = { night: '', dawn: '', morning: '', midday: '', afternoon: '', dusk: '' };

export const featureFormSchema = z.object({
  name: line,
  kind: z.enum(FEATURE_KINDS),
  shape: z.enum(SHAPES),
  places: z.string().max(PLACES_MAX, FEATURE_FIELD_ERRORS.shapeLong),
  /** '1' to '12'. */
  months: z.array(z.string().max(2)).max(12),
  /** Percent by time of day; blank: as the kind is commonly used. */
  use: z.object({ night: line, dawn: line, morning: line, midday: line, afternoon: line, dusk: line }),
  /** What a crop field holds, year by year. */
  rotation: z
    .array(z.object({ year: line, crop: line, months: z.array(z.string().max(2)).max(12) }))
    .max(MOST_CROPS, FEATURE_FIELD_ERRORS.mostYears(MOST_CROPS)),
  notes: z.string().max(NOTES_MAX, FEATURE_FIELD_ERRORS.notesLong(NOTES_MAX)),
});
export type FeatureForm = z.output<typeof featureFormSchema>;

/** What a form sets. */
export type FeatureFormValues = Pick<
  FeatureRow,
  'name' | 'kind' | 'geometry' | 'months' | 'use' | 'rotation' | 'notes'
>;

function readMonths(form: FormReader, path: string, typed: readonly string[]): number[] {
  const months = [...new Set(typed.map(Number))].sort((a, b) => a - b);
  if (months.length === 0) form.fail(path, FEATURE_FIELD_ERRORS.months);
  if (months.some((m) => !Number.isInteger(m) || m < 1 || m > 12)) form.fail(path, FEATURE_FIELD_ERRORS.monthRange);
  return months;
}

/** null: every time of day as the kind is commonly used. */
function readUse(form: FormReader, typed: FeatureForm['use']): Partial<UseTable> | null {
  const use: Partial<UseTable> = {};
  for (const time of TIMES_OF_DAY) {
    const percent = form.number(`use.${time}`, typed[time], {
      label: FEATURE_FIELD_ERRORS.use,
      min: 0,
      max: 100,
      unit: FEATURE_FIELD_ERRORS.percent,
    });
    if (percent !== null) use[time] = percent / 100;
  }
  return Object.keys(use).length === 0 ? null : use;
}

function readRotation(form: FormReader, typed: FeatureForm['rotation']): CropYear[] {
  const years = new Set<number>();
  return typed.map(({ year, crop, months }, i): CropYear => {
    const rule = { label: FEATURE_FIELD_ERRORS.year, min: 1990, max: 2200, whole: true };
    const read = form.needNumber(`rotation.${i}.year`, year, rule);
    if (years.has(read)) form.fail(`rotation.${i}.year`, FEATURE_FIELD_ERRORS.cropTwice(read));
    years.add(read);
    return {
      year: read,
      crop: form.name(`rotation.${i}.crop`, crop),
      months: readMonths(form, `rotation.${i}.months`, months),
    };
  });
}

export function makeFeatureSchema(club: FormClub) {
  return featureFormSchema.transform((typed, ctx): FeatureFormValues => {
    const form = readForm(ctx);
    const name = form.name('name', typed.name);
    const months = readMonths(form, 'months', typed.months);
    const use = readUse(form, typed.use);
    const rotation = typed.kind === 'crop' ? readRotation(form, typed.rotation) : [];
    const parsed = parseGeometry(typed.shape, typed.places, club);
    if (!parsed.ok) {
      form.fail('places', parsed.message);
      return z.NEVER;
    }
    const geometry: DrawnGeometry = parsed.geometry;
    const { kind } = typed;
    return form.failed() ? z.NEVER : { name, kind, geometry, months, use, rotation, notes: typed.notes.trim() };
  });
}

export const ALL_MONTHS = Array.from({ length: 12 }, (_, i) => String(i + 1));

export function emptyFeatureForm(): FeatureForm {
  return {
    name: '',
    kind: 'bedding',
    shape: 'area',
    places: '',
    months: [...ALL_MONTHS],
    use: { ...NO_USE },
    rotation: [],
    notes: '',
  };
}

export function featureFormOf(feature: FeatureFormValues): FeatureForm {
  const { shape, text } = geometryText(feature.geometry);
  const { name, kind, notes } = feature;
  const share = (time: (typeof TIMES_OF_DAY)[number]) => {
    const own = feature.use?.[time];
    return own === undefined ? '' : numberText(own * 100, 1);
  };
  return {
    name,
    kind,
    shape,
    places: text,
    months: feature.months.map(String),
    use: {
      night: share('night'),
      dawn: share('dawn'),
      morning: share('morning'),
      midday: share('midday'),
      afternoon: share('afternoon'),
      dusk: share('dusk'),
    },
    rotation: feature.rotation.map((one) => ({
      year: String(one.year),
      crop: one.crop,
      months: one.months.map(String),
    })),
    notes,
  };
}
