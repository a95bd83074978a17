import type { Position } from 'geojson';
import { z } from 'zod';
import { distanceM, type LatLon, toLocal } from '@/core/geometry';
import type { ApproachValues } from './approaches-data';
import type { FormClub } from './form-club';
import { parsePoints, pointsText } from './geometry-text';
import { LINE_MAX, NOTES_MAX, readForm } from './read-form';
import { APPROACH_FIELD_ERRORS } from './words/field-errors';

export const DIRECTIONS = ['in', 'out', 'both'] as const;

/** A line that begins or ends this near is taken to be there already. */
const SAME_PLACE_M = 15;

const line = z.string().max(LINE_MAX, APPROACH_FIELD_ERRORS.long(LINE_MAX));

export const approachFormSchema = z.object({
  name: line,
  /** Blank: no parking place is named. */
  parkingId: line,
  direction: z.enum(DIRECTIONS),
  points: z.string().max(60_000, APPROACH_FIELD_ERRORS.shapeLong),
  /** Number of the last line that is driven; blank: all on foot. */
  drivenTo: line,
  notes: z.string().max(NOTES_MAX, APPROACH_FIELD_ERRORS.notesLong(NOTES_MAX)),
});
export type ApproachForm = z.output<typeof approachFormSchema>;

export interface ApproachPlaces {
  stand: LatLon & { name: string };
  parkings: (LatLon & { id: string; name: string })[];
}

/** A way tied to its ends: the parking place and the stand are added where the line does not reach them. */
export function tieEnds(
  centre: LatLon,
  points: Position[],
  ends: { stand: LatLon; parking: LatLon | undefined },
): { points: Position[]; added: number } {
  const { stand, parking } = ends;
  const apart = ([lon = 0, lat = 0]: Position, at: LatLon) =>
    distanceM(toLocal(centre, { lat, lon }), toLocal(centre, at));
  const [first, last] = [points[0], points.at(-1)];
  const lead = parking && (!first || apart(first, parking) > SAME_PLACE_M) ? [[parking.lon, parking.lat]] : [];
  const end = !last || apart(last, stand) > SAME_PLACE_M ? [[stand.lon, stand.lat]] : [];
  return { points: [...lead, ...points, ...end], added: lead.length };
}

/** From the form to what is stored: the parking place and the stand are set at the ends where the line does not reach them. */
export function makeApproachSchema(club: FormClub, places: ApproachPlaces) {
  const { stand } = places;
  const apart = ([lon = 0, lat = 0]: Position, at: LatLon) => distanceM(toLocal(club, { lat, lon }), toLocal(club, at));
  return approachFormSchema.transform((typed, ctx): ApproachValues => {
    const form = readForm(ctx);
    const name = form.name('name', typed.name);
    const parking = places.parkings.find((p) => p.id === typed.parkingId);
    if (typed.parkingId !== '' && !parking) form.fail('parkingId', APPROACH_FIELD_ERRORS.parkingGone);
    const read = parsePoints(typed.points, club);
    if (!read.ok) {
      form.fail('points', read.message);
      return z.NEVER;
    }
    const [first, last] = [read.points[0], read.points.at(-1)];
    if (!first && !parking) form.fail('points', APPROACH_FIELD_ERRORS.points);
    if (first && last && apart(last, stand) > 2 * SAME_PLACE_M && apart(first, stand) < apart(last, stand) / 2) {
      form.fail('points', APPROACH_FIELD_ERRORS.beginsAtStand(stand.name));
    }
    const tied = tieEnds(club, read.points, { stand, parking });
    const rule = { label: APPROACH_FIELD_ERRORS.drivenTo, min: 1, max: Math.max(1, read.points.length), whole: true };
    const driven = form.number('drivenTo', typed.drivenTo, rule);
    const values: ApproachValues = {
      name,
      parkingId: parking?.id ?? null,
      direction: typed.direction,
      points: tied.points,
      vehicleToIndex: driven === null ? 0 : tied.added + driven - 1,
      notes: typed.notes.trim(),
    };
    return form.failed() ? z.NEVER : values;
  });
}

export function emptyApproachForm(): ApproachForm {
  return { name: '', parkingId: '', direction: 'both', points: '', drivenTo: '', notes: '' };
}

export function approachFormOf(approach: ApproachValues): ApproachForm {
  const { name, parkingId, direction, points, vehicleToIndex, notes } = approach;
  const drivenTo = vehicleToIndex === 0 ? '' : String(vehicleToIndex + 1);
  return { name, parkingId: parkingId ?? '', direction, points: pointsText(points), drivenTo, notes };
}
