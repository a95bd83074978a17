import { z } from 'zod';
import { SHELTER_CLASSES, STAND_KINDS, SUITABILITIES, WEAPONS, type Weapon } from '@/core/ground-types';
import { ftToM, type Units, ydToM } from '@/core/units';
import { ARC_FIELDS, type ArcField, readArcs } from './arc-text';
import { parseBearing } from './bearing-text';
import type { FormClub } from './form-club';
import { readPlace } from './place-text';
import { type FormReader, LINE_MAX, NOTES_MAX, readForm } from './read-form';
import type { StandValues } from './stands-data';
import { STAND_FIELD_ERRORS } from './words/field-errors';

const line = z.string().max(LINE_MAX, STAND_FIELD_ERRORS.long(LINE_MAX));

/** What the form holds: text in the club's units. */
export const standFormSchema = z.object({
  name: line,
  kind: z.enum(STAND_KINDS),
  lat: line,
  lon: line,
  seatHeight: line,
  facing: line,
  shotSide: z.enum(['left', 'right', 'either']),
  /** Blank: the weapon is not allowed here. */
  shotRange: z.object({ bow: line, crossbow: line, muzzleloader: line, shotgun: line, rifle: line }),
  shelter: z.enum(SHELTER_CLASSES),
  seats: line,
  arcsBoth: line,
  arcsMorning: line,
  arcsEvening: line,
  morning: z.enum(SUITABILITIES),
  evening: z.enum(SUITABILITIES),
  restDays: line,
  mostSitsSeason: line,
  drainBearing: line,
  slopePercent: line,
  whoMayHunt: z.enum(['everyone', 'named']),
  allowedMemberIds: z.array(z.string().max(40)).max(500),
  notes: z.string().max(NOTES_MAX, STAND_FIELD_ERRORS.notesLong(NOTES_MAX)),
});
export type StandForm = z.output<typeof standFormSchema>;

/** Bounds as typed; both systems hold a seat to about 15 m and a shot to about 550 m. */
export const STAND_LIMITS: Record<Units, { height: number; heightUnit: string; range: number; rangeUnit: string }> = {
  us: { height: 49, heightUnit: 'ft', range: 600, rangeUnit: 'yd' },
  metric: { height: 15, heightUnit: 'm', range: 550, rangeUnit: 'm' },
};

function readRanges(form: FormReader, typed: StandForm['shotRange'], units: Units): Partial<Record<Weapon, number>> {
  const { range: max, rangeUnit: unit } = STAND_LIMITS[units];
  const ranges: Partial<Record<Weapon, number>> = {};
  for (const weapon of WEAPONS) {
    const range = form.number(`shotRange.${weapon}`, typed[weapon], {
      label: STAND_FIELD_ERRORS.longestShot,
      min: 1,
      max,
      unit,
    });
    if (range !== null) ranges[weapon] = units === 'us' ? ydToM(range) : range;
  }
  if (WEAPONS.every((weapon) => typed[weapon].trim() === '')) {
    form.fail('shotRange.bow', STAND_FIELD_ERRORS.oneWeapon);
  }
  return ranges;
}

function readBearing(form: FormReader, path: string, text: string): number | null {
  const parsed = parseBearing(text);
  if (parsed.ok) return parsed.deg;
  form.fail(path, parsed.message);
  return null;
}

function readAllArcs(form: FormReader, typed: Record<ArcField, string>): StandValues['arcs'] {
  return ARC_FIELDS.flatMap(({ name, window }) => {
    const read = readArcs(typed[name], window);
    if (!read.ok) form.fail(name, read.message);
    return read.ok ? read.arcs : [];
  });
}

/** From the form to what is stored, in metres and degrees. */
export function makeStandSchema(club: FormClub) {
  return standFormSchema.transform((typed, ctx): StandValues => {
    const form = readForm(ctx);
    const { height: max, heightUnit: unit } = STAND_LIMITS[club.units];
    // In the form's own order, so that the list of mistakes follows it.
    const name = form.name('name', typed.name);
    const place = readPlace(form, club, typed);
    const height = form.needNumber('seatHeight', typed.seatHeight, {
      label: STAND_FIELD_ERRORS.seatHeight,
      min: 0,
      max,
      unit,
    });
    const days = { label: STAND_FIELD_ERRORS.restDays, min: 0, max: 60, whole: true };
    const most = { label: STAND_FIELD_ERRORS.mostSits, min: 1, max: 365, whole: true };
    const named = typed.whoMayHunt === 'named';
    const values: StandValues = {
      name,
      kind: typed.kind,
      lat: place.lat,
      lon: place.lon,
      seatHeightM: club.units === 'us' ? ftToM(height) : height,
      facingDeg: readBearing(form, 'facing', typed.facing),
      shotSide: typed.shotSide,
      shotRangeM: readRanges(form, typed.shotRange, club.units),
      shelter: typed.shelter,
      seats: form.needNumber('seats', typed.seats, { label: STAND_FIELD_ERRORS.seats, min: 1, max: 8, whole: true }),
      arcs: readAllArcs(form, typed),
      morning: typed.morning,
      evening: typed.evening,
      restDays: form.number('restDays', typed.restDays, days),
      mostSitsSeason: form.number('mostSitsSeason', typed.mostSitsSeason, most),
      drainBearingDeg: readBearing(form, 'drainBearing', typed.drainBearing),
      slopePercent: form.number('slopePercent', typed.slopePercent, {
        label: STAND_FIELD_ERRORS.slope,
        min: 0,
        max: 200,
        unit: STAND_FIELD_ERRORS.percent,
      }),
      allowedMemberIds: named ? [...new Set(typed.allowedMemberIds)] : null,
      notes: typed.notes.trim(),
    };
    if (named && typed.allowedMemberIds.length === 0) form.fail('allowedMemberIds', STAND_FIELD_ERRORS.oneMember);
    return form.failed() ? z.NEVER : values;
  });
}
