import type { Arc } from './ground-types';
import { ktToMps } from './units';
import { WIND_ERRORS } from './words/winds';

export interface MetarWind {
  kind: 'wind' | 'variable' | 'calm';
  /** null when variable or calm. True, where the wind comes from, (0, 360]. */
  fromDeg: number | null;
  speedMps: number;
  gustMps: number | null;
  /** The span the direction moves in, when reported. */
  range: Arc | null;
}

export type ParsedMetarWind = { ok: true; wind: MetarWind } | { ok: false; message: string };

const GROUP = /^(\d{3}|VRB)(\d{2,3})(?:G(\d{2,3}))?(KT|MPS)$/;
const RANGE = /^(\d{3})V(\d{3})$/;

/**
 * The wind groups of a METAR: 'VRB04KT', '00000KT', '21012KT 160V250', '32012G22KT', also in MPS. Variable means no
 * direction can be given; calm is 00000. Speeds come out in m/s (1 kt = 1852/3600 m/s). FMH-1; ICAO Annex 3.
 */
export function parseMetarWind(text: string): ParsedMetarWind {
  const [group = '', spread, ...rest] = text.trim().toUpperCase().split(/\s+/);
  const match = GROUP.exec(group);
  if (!match || rest.length > 0) return { ok: false, message: WIND_ERRORS.notMetar(text.trim()) };
  const [, direction = '', speed = '', gust, unit] = match;
  const toMps = (value: string) => (unit === 'KT' ? ktToMps(Number(value)) : Number(value));
  const degrees = direction === 'VRB' ? null : Number(direction);
  if (degrees !== null && degrees > 360) return { ok: false, message: WIND_ERRORS.overCircle(direction) };
  let range: Arc | null = null;
  if (spread !== undefined) {
    const [, from, to] = RANGE.exec(spread) ?? [];
    if (!from || !to || Number(from) > 360 || Number(to) > 360) {
      return { ok: false, message: WIND_ERRORS.notSpan(spread) };
    }
    range = { fromDeg: Number(from) % 360, toDeg: Number(to) % 360 };
  }
  const speedMps = toMps(speed);
  const gustMps = gust === undefined ? null : toMps(gust);
  if (speedMps === 0) return { ok: true, wind: { kind: 'calm', fromDeg: null, speedMps, gustMps, range } };
  // North is reported as 360; 000 goes with calm only and is read as no direction otherwise.
  if (degrees === null || degrees === 0) {
    return { ok: true, wind: { kind: 'variable', fromDeg: null, speedMps, gustMps, range } };
  }
  return { ok: true, wind: { kind: 'wind', fromDeg: degrees, speedMps, gustMps, range } };
}
