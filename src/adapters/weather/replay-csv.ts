import type { WeatherHour } from '@/core/condition-types';
import { REPLAY_FAULTS } from './words';

/** A row that was left out, by its line in the file (the heading is line 1). */
export interface ReplayProblem {
  line: number;
  message: string;
}

export interface ReplayHours {
  /** In order of time; hours missing from the file are missing here. */
  hours: WeatherHour[];
  problems: ReplayProblem[];
}

const MPS_PER_MPH = 0.44704;
const MM_PER_INCH = 25.4;

const NEEDED = ['time_utc', 'wind_from_deg', 'wind_speed_mph'] as const;

/** Widest values a surface station can report; outside them the row is a typing error, not weather. */
const LIMITS = {
  wind_from_deg: [0, 360],
  wind_speed_mph: [0, 250],
  wind_gust_mph: [0, 300],
  temp_f: [-130, 140],
  pressure_hpa: [850, 1100],
  precip_in: [0, 20],
} as const;
type NumberColumn = keyof typeof LIMITS;

const INSTANT = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2}(\.\d+)?)?(Z|[+-]\d{2}:\d{2})$/;

/**
 * Reads hourly observations: columns time_utc, wind_from_deg, wind_speed_mph and, where the file has them, wind_gust_mph,
 * temp_f, pressure_hpa, precip_in, in any order. An empty cell is not given; an empty direction with a speed above zero is
 * a variable wind; speed 0 is calm. Never throws: a bad row is left out and named by its line, a gap stays a gap.
 */
export function parseReplayCsv(text: string): ReplayHours {
  const lines = text.replace(/^\uFEFF/, '').split(/\r\n|\n|\r/);
  const heading = cells(lines[0] ?? '').map((name) => name.toLowerCase());
  const missing = NEEDED.filter((name) => !heading.includes(name));
  if (missing.length > 0) {
    return { hours: [], problems: [{ line: 1, message: REPLAY_FAULTS.noColumns(missing) }] };
  }
  const problems: ReplayProblem[] = [];
  const byInstant = new Map<number, { line: number; hour: WeatherHour }>();
  for (const [index, raw] of lines.entries()) {
    if (index === 0 || raw.trim() === '') continue;
    const line = index + 1;
    const row = readRow(heading, cells(raw));
    if (typeof row === 'string') {
      problems.push({ line, message: row });
      continue;
    }
    const earlier = byInstant.get(row.at);
    if (earlier) problems.push({ line, message: REPLAY_FAULTS.sameTime(earlier.line) });
    else byInstant.set(row.at, { line, hour: row });
  }
  const hours = [...byInstant.values()].map((kept) => kept.hour).sort((a, b) => a.at - b.at);
  return { hours, problems };
}

function cells(line: string): string[] {
  return line.split(',').map((cell) =>
    cell
      .trim()
      .replace(/^"(.*)"$/, '$1')
      .trim(),
  );
}

/** The hour, or what is wrong with the row. */
function readRow(heading: string[], row: string[]): WeatherHour | string {
  if (row.length !== heading.length) return REPLAY_FAULTS.cells(row.length, heading.length);
  const time = row[heading.indexOf('time_utc')] ?? '';
  const at = readInstant(time);
  if (at === null) return REPLAY_FAULTS.notInstant(time);
  const values = new Map<NumberColumn, number | null>();
  for (const [column, [least, most]] of Object.entries(LIMITS) as [NumberColumn, readonly [number, number]][]) {
    const cell = row[heading.indexOf(column)] ?? '';
    const value = cell === '' ? null : Number(cell);
    if (value !== null && !(value >= least && value <= most)) {
      return REPLAY_FAULTS.outOfRange(column, cell, least, most);
    }
    values.set(column, value);
  }
  const given = (column: NumberColumn) => values.get(column) ?? null;
  const speed = given('wind_speed_mph');
  const from = given('wind_from_deg');
  return {
    at,
    windFromDeg: from === null || speed === null || speed === 0 ? null : from % 360,
    windSpeedMps: scaled(speed, MPS_PER_MPH),
    gustMps: scaled(given('wind_gust_mph'), MPS_PER_MPH),
    tempC: scaled(given('temp_f'), 5 / 9, -32),
    pressureHpa: given('pressure_hpa'),
    precipMm: scaled(given('precip_in'), MM_PER_INCH),
    cloudPercent: null,
    radiationWm2: null,
    thunder: false,
  };
}

/** Date.parse rolls 30 February over into March, so the day is read back. */
function readInstant(text: string): number | null {
  if (!INSTANT.test(text)) return null;
  const at = Date.parse(text);
  const day = Date.parse(`${text.slice(0, 10)}T00:00:00Z`);
  if (!Number.isFinite(at) || !Number.isFinite(day)) return null;
  return new Date(day).toISOString().slice(0, 10) === text.slice(0, 10) ? at : null;
}

function scaled(value: number | null, factor: number, offset = 0): number | null {
  return value === null ? null : (value + offset) * factor;
}
