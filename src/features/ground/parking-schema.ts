import { z } from 'zod';
import type { FormClub } from './form-club';
import type { ParkingValues } from './parkings-data';
import { degreesText, readPlace } from './place-text';
import { LINE_MAX, NOTES_MAX, readForm } from './read-form';
import { PARKING_FIELD_ERRORS } from './words/field-errors';

const line = z.string().max(LINE_MAX, PARKING_FIELD_ERRORS.long(LINE_MAX));

export const parkingFormSchema = z.object({
  name: line,
  lat: line,
  lon: line,
  notes: z.string().max(NOTES_MAX, PARKING_FIELD_ERRORS.notesLong(NOTES_MAX)),
});
export type ParkingForm = z.output<typeof parkingFormSchema>;

export function makeParkingSchema(club: FormClub) {
  return parkingFormSchema.transform((typed, ctx): ParkingValues => {
    const form = readForm(ctx);
    const values = { name: form.name('name', typed.name), ...readPlace(form, club, typed), notes: typed.notes.trim() };
    const { name, lat, lon, notes } = values;
    return form.failed() ? z.NEVER : { name, lat, lon, notes };
  });
}

export function emptyParkingForm(): ParkingForm {
  return { name: '', lat: '', lon: '', notes: '' };
}

export function parkingFormOf(parking: ParkingValues): ParkingForm {
  return { name: parking.name, lat: degreesText(parking.lat), lon: degreesText(parking.lon), notes: parking.notes };
}
