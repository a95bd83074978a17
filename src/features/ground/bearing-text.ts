import { normalizeDeg } from '@/core/angles';
import { findSector, SECTORS, sectorName } from '@/core/sectors';
import { numberText, parseNumber } from '@/features/clubs/read-number';
import { TYPED_FIELD_ERRORS } from './words/field-errors';

export type ParsedBearing = { ok: true; deg: number | null } | { ok: false; message: string };

/** A direction as typed: a compass point is its middle, a number is degrees from true north; blank is none. */
export function parseBearing(text: string): ParsedBearing {
  const trimmed = text.trim().replace(/°$/, '').trim();
  if (trimmed === '') return { ok: true, deg: null };
  const sector = findSector(trimmed);
  if (sector) return { ok: true, deg: sector.centreDeg };
  const deg = parseNumber(trimmed);
  if (deg === null || deg < 0 || deg > 360) {
    return { ok: false, message: TYPED_FIELD_ERRORS.bearing };
  }
  return { ok: true, deg: normalizeDeg(deg) };
}

/** What a form shows of a direction: the point where it is one's middle, else degrees. */
export function bearingText(deg: number | null): string {
  if (deg === null) return '';
  return SECTORS.find((s) => s.centreDeg === deg)?.name ?? numberText(deg);
}

/** A direction for people: 'NW · 315°'. */
export function formatBearing(deg: number): string {
  return `${sectorName(deg)} · ${Math.round(deg) % 360}°`;
}
