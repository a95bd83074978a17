import { z } from 'zod';
import { isZone } from '@/core/day-time';
import { UNIT_SYSTEMS } from '@/core/units';
import { formReader } from './read-number';
import { CLUB_FIELD_ERRORS } from './words/field-errors';

const line = z.string().max(200, CLUB_FIELD_ERRORS.longText);

/** Words that stand in addresses beside the clubs' own. */
const RESERVED_SLUGS = ['new'];

const nameField = z
  .string()
  .trim()
  .min(1, CLUB_FIELD_ERRORS.name)
  .max(80, CLUB_FIELD_ERRORS.nameLong)
  .refine((name) => !/[\p{Cc}\p{Cf}<>]/u.test(name), CLUB_FIELD_ERRORS.nameSigns);

const slugField = z
  .string()
  .trim()
  .toLowerCase()
  .min(3, CLUB_FIELD_ERRORS.slugShort)
  .max(40, CLUB_FIELD_ERRORS.slugLong)
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, CLUB_FIELD_ERRORS.slugSigns)
  .refine((slug) => !RESERVED_SLUGS.includes(slug), CLUB_FIELD_ERRORS.slugKept);

const placeFields = {
  name: nameField,
  lat: line,
  lon: line,
  zone: z.string().max(60).refine(isZone, CLUB_FIELD_ERRORS.zone),
  units: z.enum(UNIT_SYSTEMS),
};

interface TypedPlace {
  lat: string;
  lon: string;
}

/** Degrees as typed; near the poles there is neither a sunrise to count from nor a whitetail. */
function readPlace<T extends TypedPlace>(typed: T, ctx: z.RefinementCtx) {
  const form = formReader(ctx);
  const lat = form.needNumber(['lat'], typed.lat, {
    label: CLUB_FIELD_ERRORS.latitude,
    min: -66,
    max: 66,
    unit: CLUB_FIELD_ERRORS.degrees,
  });
  const lon = form.needNumber(['lon'], typed.lon, {
    label: CLUB_FIELD_ERRORS.longitude,
    min: -180,
    max: 180,
    unit: CLUB_FIELD_ERRORS.degrees,
  });
  return form.failed() ? z.NEVER : { ...typed, lat, lon };
}

export const createClubSchema = z.object({ ...placeFields, slug: slugField }).transform(readPlace);
export type CreateClubForm = z.input<typeof createClubSchema>;
export type CreateClubInput = z.output<typeof createClubSchema>;

export const changePlaceSchema = z.object({ ...placeFields, version: z.number().int().min(1) }).transform(readPlace);
export type ChangePlaceForm = z.input<typeof changePlaceSchema>;
export type ChangePlaceInput = z.output<typeof changePlaceSchema>;
