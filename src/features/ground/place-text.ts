import { distanceM, type LatLon, toLocal } from '@/core/geometry';
import { numberText, parseNumber } from '@/features/clubs/read-number';
import type { FormReader } from './read-form';
import { TYPED_FIELD_ERRORS } from './words/field-errors';

/** Ground further from the club than this is a slip of the hand. */
const FARTHEST_M = 100_000;

const BOUNDS = { lat: 90, lon: 180 } as const;
const SIGNS: Record<string, { axis: 'lat' | 'lon'; sign: 1 | -1 }> = {
  N: { axis: 'lat', sign: 1 },
  S: { axis: 'lat', sign: -1 },
  E: { axis: 'lon', sign: 1 },
  W: { axis: 'lon', sign: -1 },
};

/** Degrees as typed: '-83.195', '83.195 W' or '83.195° W'; null when it is no such number. */
export function parseDegrees(text: string, axis: 'lat' | 'lon'): number | null {
  const match = /^(.*?)\s*°?\s*([NSEW])?$/i.exec(text.trim());
  const value = match?.[1] === undefined ? null : parseNumber(match[1]);
  if (value === null || Math.abs(value) > BOUNDS[axis]) return null;
  const letter = match?.[2]?.toUpperCase();
  if (letter === undefined) return value;
  const side = SIGNS[letter];
  return side?.axis === axis && value >= 0 ? value * side.sign + 0 : null;
}

/** Why a place cannot be the club's; null when it can. */
export function farFromClub(club: LatLon, at: LatLon): string | null {
  const near = (p: LatLon) => distanceM({ eastM: 0, northM: 0 }, toLocal(club, p)) <= FARTHEST_M;
  if (near(at)) return null;
  if (Math.abs(at.lon) <= 90 && near({ lat: at.lon, lon: at.lat })) {
    return TYPED_FIELD_ERRORS.farSwapped;
  }
  if (near({ lat: at.lat, lon: -at.lon })) return TYPED_FIELD_ERRORS.farMinus;
  return TYPED_FIELD_ERRORS.far;
}

/** The place of a form with a field for each number. */
export function readPlace(form: FormReader, club: LatLon, typed: { lat: string; lon: string }): LatLon {
  const lat = parseDegrees(typed.lat, 'lat');
  const lon = parseDegrees(typed.lon, 'lon');
  if (lat === null) form.fail('lat', TYPED_FIELD_ERRORS.latitude);
  if (lon === null) form.fail('lon', TYPED_FIELD_ERRORS.longitude);
  if (lat === null || lon === null) return club;
  const far = farFromClub(club, { lat, lon });
  if (far) form.fail('lat', far);
  return { lat, lon };
}

/** Six decimals are about a hand's breadth on the ground. */
export function degreesText(deg: number): string {
  return numberText(deg, 6);
}
