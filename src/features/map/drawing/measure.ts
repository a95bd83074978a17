import type { Geometry, Position } from 'geojson';
import { normalizeDeg } from '@/core/angles';
import { bearingDeg, distanceM, type LatLon, lengthM, toLocal } from '@/core/geometry';
import type { Point } from '@/core/ground-types';
import { sectorName } from '@/core/sectors';
import { formatArea, formatDistance, m2ToAcre, mToYd, type Units } from '@/core/units';
import { MEASURED_WORDS } from '../words/drawing';

export function localOf(centre: LatLon, [lon = 0, lat = 0]: Position): Point {
  return toLocal(centre, { lat, lon });
}

/** Square metres in a ring about the centre, open or closed. */
export function ringAreaM2(centre: LatLon, ring: readonly Position[]): number {
  const points = ring.map((p) => localOf(centre, p));
  const twice = points.reduce((sum, p, i) => {
    const next = points[(i + 1) % points.length] ?? p;
    return sum + p.eastM * next.northM - next.eastM * p.northM;
  }, 0);
  return Math.abs(twice) / 2;
}

export interface Size {
  lengthM: number;
  /** null: a point or a line. */
  areaM2: number | null;
}

/** Length of a line, or the way round an area and what it holds; parts add up. */
export function sizeOf(centre: LatLon, geometry: Geometry): Size {
  const along = (line: readonly Position[]) => lengthM(line.map((p) => localOf(centre, p)));
  const area = (rings: readonly Position[][]): Size => {
    const [outer = 0, ...holes] = rings.map((ring) => ringAreaM2(centre, ring));
    return { lengthM: along(rings[0] ?? []), areaM2: outer - holes.reduce((sum, hole) => sum + hole, 0) };
  };
  const sum = (parts: Size[]): Size => ({
    lengthM: parts.reduce((total, part) => total + part.lengthM, 0),
    areaM2: parts.some((part) => part.areaM2 !== null)
      ? parts.reduce((total, part) => total + (part.areaM2 ?? 0), 0)
      : null,
  });
  switch (geometry.type) {
    case 'LineString':
      return { lengthM: along(geometry.coordinates), areaM2: null };
    case 'MultiLineString':
      return sum(geometry.coordinates.map((line) => ({ lengthM: along(line), areaM2: null })));
    case 'Polygon':
      return area(geometry.coordinates);
    case 'MultiPolygon':
      return sum(geometry.coordinates.map(area));
    case 'GeometryCollection':
      return sum(geometry.geometries.map((part) => sizeOf(centre, part)));
    default:
      return { lengthM: 0, areaM2: null };
  }
}

/** '212 yd', '4.5 acres, 640 yd round'; empty for a point. Small areas in square yards, where acres would read nought. */
export function sizeText(centre: LatLon, geometry: Geometry, units: Units): string {
  const { lengthM: length, areaM2 } = sizeOf(centre, geometry);
  if (areaM2 === null) return length > 0 ? formatDistance(length, units) : '';
  const small = units === 'us' ? m2ToAcre(areaM2) < 0.1 : areaM2 < 1000;
  const tiny =
    units === 'us' ? MEASURED_WORDS.squareYards(Math.round(areaM2 / 0.9144 ** 2)) : `${Math.round(areaM2)} m²`;
  return MEASURED_WORDS.area(small ? tiny : formatArea(areaM2, units), formatDistance(length, units));
}

export interface Leg {
  metres: number;
  trueDeg: number;
  /** null: no magnetic model covers the day. */
  magneticDeg: number | null;
}

/** From one place to another: how far, and by which bearing a person walks it. */
export function legBetween(centre: LatLon, from: Position, to: Position, declinationDeg: number | null): Leg {
  const [a, b] = [localOf(centre, from), localOf(centre, to)];
  const trueDeg = bearingDeg(a, b);
  return {
    metres: distanceM(a, b),
    trueDeg,
    magneticDeg: declinationDeg === null ? null : normalizeDeg(trueDeg - declinationDeg),
  };
}

/** '240 yd toward NW, 314° true, 325° by compass'. */
export function legText(leg: Leg, units: Units): string {
  const whole = (deg: number) => `${Math.round(deg) % 360}°`;
  const compass = leg.magneticDeg === null ? null : whole(leg.magneticDeg);
  const far =
    units === 'us'
      ? MEASURED_WORDS.yards(Math.round(mToYd(leg.metres)).toLocaleString('en-US'))
      : formatDistance(leg.metres, units);
  return MEASURED_WORDS.leg(far, sectorName(leg.trueDeg), whole(leg.trueDeg), compass);
}

/** '11.2° west': of true north. */
export function declinationSide(deg: number): string {
  const size = `${Math.abs(deg).toFixed(1)}°`;
  return deg < 0 ? MEASURED_WORDS.west(size) : MEASURED_WORDS.east(size);
}
