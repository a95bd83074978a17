import { z } from 'zod';
import { isZone } from '@/core/day-time';
import { UNIT_SYSTEMS } from '@/core/units';
import { formReader } from './read-number';

const line = z.string().max(200, 'Keep it to 200 characters.');

/** Words that stand in addresses beside the clubs' own. */
const RESERVED_SLUGS = ['new'];

const nameField = z
  .string()
  .trim()
  .min(1, 'Give the club a name.')
  .max(80, 'Keep the name to 80 characters.')
  .refine((name) => !/[\p{Cc}\p{Cf}<>]/u.test(name), 'Use letters, digits and plain signs only.');

const slugField = z
  .string()
  .trim()
  .toLowerCase()
  .min(3, 'Use at least 3 characters.')
  .max(40, 'Use at most 40 characters.')
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'Use small letters, digits and single dashes, such as spring-hollow.')
  .refine((slug) => !RESERVED_SLUGS.includes(slug), 'This address is kept for Windrest itself. Choose another.');

const placeFields = {
  name: nameField,
  lat: line,
  lon: line,
  zone: z.string().max(60).refine(isZone, 'Choose the time zone of the ground.'),
  units: z.enum(UNIT_SYSTEMS),
};

interface TypedPlace {
  lat: string;
  lon: string;
}

/** Degrees as typed; near the poles there is neither a sunrise to count from nor a whitetail. */
function readPlace<T extends TypedPlace>(typed: T, ctx: z.RefinementCtx) {
  const form = formReader(ctx);
  const lat = form.needNumber(['lat'], typed.lat, { label: 'Latitude', min: -66, max: 66, unit: 'degrees' });
  const lon = form.needNumber(['lon'], typed.lon, { label: 'Longitude', min: -180, max: 180, unit: 'degrees' });
  return form.failed() ? z.NEVER : { ...typed, lat, lon };
}

export const createClubSchema = z.object({ ...placeFields, slug: slugField }).transform(readPlace);
export type CreateClubForm = z.input<typeof createClubSchema>;
export type CreateClubInput = z.output<typeof createClubSchema>;

export const changePlaceSchema = z.object({ ...placeFields, version: z.number().int().min(1) }).transform(readPlace);
export type ChangePlaceForm = z.input<typeof changePlaceSchema>;
export type ChangePlaceInput = z.output<typeof changePlaceSchema>;
