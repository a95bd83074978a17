import type { Position } from 'geojson';
import type { DrawnGeometry } from '@/features/ground/geometry-text';
import type { ExportLayer } from '../exchange-schema';

/** One thing on its way out. */
export interface Exported {
  layer: ExportLayer;
  /** 'stand:ladder', 'item:wood': read back as the same. */
  kind: string;
  /** Never empty. */
  name: string;
  notes: string;
  geometry: DrawnGeometry;
}

export interface ExportedMap {
  club: string;
  madeAt: number;
  things: Exported[];
}

/** Without control characters and what else XML 1.0 has no place for. */
export function plain(text: string): string {
  return text.replace(/(?![\t\n\r])\p{Cc}|[\ufffe\uffff]/gu, '');
}

/** Text as XML holds it. */
export function xml(text: string): string {
  return plain(text).replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');
}

/** Nine decimals are a tenth of a millimetre. */
export function degrees(value: number | undefined): string {
  return String(Number((value ?? 0).toFixed(9)) + 0);
}

export function ringsOf(geometry: DrawnGeometry): Position[][] {
  if (geometry.type === 'Point') return [[geometry.coordinates]];
  return geometry.type === 'LineString' ? [geometry.coordinates] : geometry.coordinates;
}
