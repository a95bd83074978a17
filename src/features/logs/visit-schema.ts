import { z } from 'zod';
import type { PressureKind } from '@/core/condition-types';
import { isClock } from '@/core/day-time';
import type { LatLon } from '@/core/geometry';
import type { FormClub } from '@/features/ground/form-club';
import { degreesText, readPlace } from '@/features/ground/place-text';
import { LINE_MAX, readForm } from '@/features/ground/read-form';
import { sentSchema } from '@/lib/sent-schema';
import { VISIT_ERRORS } from './words/visits';

/** Everything people do on the ground but sit. */
export const VISIT_KINDS = ['camera_check', 'work', 'walk_through', 'drive', 'bump'] as const satisfies PressureKind[];
export type VisitKind = (typeof VISIT_KINDS)[number];

const PLACE_KINDS = ['stand', 'parking', 'feature'] as const;
export type PlaceKind = (typeof PLACE_KINDS)[number];

/** A place of the club, or a point of its own. */
export type VisitPlace = { of: PlaceKind; id: string } | ({ of: 'point' } & LatLon);

const line = z.string().max(LINE_MAX, VISIT_ERRORS.long(LINE_MAX));

export const visitFormSchema = z.object({
  sent: sentSchema.optional(),
  kind: z.enum(VISIT_KINDS, { error: VISIT_ERRORS.kind }),
  day: line,
  clock: line,
  /** 'stand:ID', 'parking:ID', 'feature:ID' or 'point'. */
  place: line,
  lat: line,
  lon: line,
  bumped: z.int(VISIT_ERRORS.whole).min(0, VISIT_ERRORS.negative).max(200, VISIT_ERRORS.most(200)),
  notes: z.string().trim().max(500, VISIT_ERRORS.notes),
});
export type VisitForm = z.output<typeof visitFormSchema>;

export interface VisitInput {
  kind: VisitKind;
  day: string;
  clock: string;
  place: VisitPlace;
  bumped: number;
  notes: string;
}

export function placeOf(text: string): { of: PlaceKind; id: string } | null {
  const [of = '', id = ''] = text.split(':');
  const kind = PLACE_KINDS.find((one) => one === of);
  return kind && id !== '' ? { of: kind, id } : null;
}

export function makeVisitSchema(club: FormClub) {
  return visitFormSchema.transform((typed, ctx): VisitInput => {
    const form = readForm(ctx);
    const day = form.day('day', typed.day);
    const clock = typed.clock.trim();
    if (!isClock(clock)) form.fail('clock', VISIT_ERRORS.time);
    const named = placeOf(typed.place);
    const place: VisitPlace | null =
      typed.place === 'point' ? { of: 'point', ...readPlace(form, club, { lat: typed.lat, lon: typed.lon }) } : named;
    if (!place) form.fail('place', VISIT_ERRORS.where);
    if (form.failed() || !place) return z.NEVER;
    return { kind: typed.kind, day, clock, place, bumped: typed.bumped, notes: typed.notes };
  });
}

export function emptyVisitForm(day: string, clock: string, at?: LatLon): VisitForm {
  return {
    kind: 'camera_check',
    day,
    clock,
    place: '',
    lat: at ? degreesText(at.lat) : '',
    lon: at ? degreesText(at.lon) : '',
    bumped: 0,
    notes: '',
  };
}
