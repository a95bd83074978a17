import { Unit } from '@openmeteo/sdk/unit.js';
import { Variable } from '@openmeteo/sdk/variable.js';
import { z } from 'zod';
import type { EnsembleMember, WeatherHour } from '@/core/condition-types';
import type { DecodedAnswer, DecodedVariable } from './decode-answer';
import type { WeatherPlace } from './port';
import { ANSWER_PROBLEMS } from './words';

const HOUR_S = 3600;
const DAY_MS = 86_400_000;
/** Global models have cells of up to a quarter degree; an answer further off is for another place. */
const MOST_OFF_DEG = 0.5;
/** WMO code table 4677, as the service gives it. */
const THUNDER_FROM = 95;
const THUNDER_TO = 99;

const given = (least: number, most: number) => z.number().min(least).max(most).nullable();

const hourSchema = z.object({
  at: z.int(),
  windFromDeg: given(0, 360),
  windSpeedMps: given(0, 110),
  gustMps: given(0, 140),
  tempC: given(-90, 60),
  pressureHpa: given(850, 1100),
  precipMm: given(0, 500),
  cloudPercent: given(0, 100),
  radiationWm2: given(0, 1500),
  thunder: z.boolean(),
}) satisfies z.ZodType<WeatherHour>;

const memberHourSchema = hourSchema.pick({ at: true, windFromDeg: true, windSpeedMps: true });

/** What hours an answer must begin and end at, UTC ms. */
export interface AnswerSpan {
  startsAt: (at: number) => boolean;
  endsAt: (at: number) => boolean;
}

/** From before now to well after it. */
function forecastSpan(now: number): AnswerSpan {
  return {
    startsAt: (at) => at <= now + HOUR_S * 1000 && at > now - 7 * DAY_MS,
    endsAt: (at) => at >= now + DAY_MS && at < now + 40 * DAY_MS,
  };
}

/** The frame of an answer: the right place, whole hours, the time asked for. */
function frameSchema(place: WeatherPlace, span: AnswerSpan) {
  const lonReach = MOST_OFF_DEG / Math.max(0.05, Math.cos((place.lat * Math.PI) / 180));
  return z.object({
    lat: z.number().refine((lat) => Math.abs(lat - place.lat) <= MOST_OFF_DEG, ANSWER_PROBLEMS.otherPlace),
    lon: z.number().refine((lon) => {
      const off = Math.abs(lon - place.lon) % 360;
      return Math.min(off, 360 - off) <= lonReach;
    }, ANSWER_PROBLEMS.otherPlace),
    intervalS: z.literal(HOUR_S),
    startS: z
      .int()
      .multipleOf(HOUR_S)
      .refine((start) => span.startsAt(start * 1000), ANSWER_PROBLEMS.startsElsewhen),
    endS: z
      .int()
      .multipleOf(HOUR_S)
      .refine((end) => span.endsAt(end * 1000), ANSWER_PROBLEMS.endsElsewhen),
  });
}

export type Checked<T> = { ok: true; value: T } | { ok: false; problem: string };

/** Hours of a plain forecast; refused when the frame, a unit or a value is wrong or most hours have no wind. */
export function checkHours(
  answer: DecodedAnswer | null,
  place: WeatherPlace,
  now: number,
  span: AnswerSpan = forecastSpan(now),
): Checked<WeatherHour[]> {
  const framed = checkFrame(answer, place, span);
  if (!framed.ok) return framed;
  const { instants, variables } = framed.value;
  const column = (variable: Variable, unit: Unit) => findColumn(variables, variable, unit, 0, instants.length);
  const speed = column(Variable.wind_speed, Unit.metre_per_second);
  const from = column(Variable.wind_direction, Unit.degree_direction);
  if (!speed || !from) return { ok: false, problem: ANSWER_PROBLEMS.noWind };
  const gust = column(Variable.wind_gusts, Unit.metre_per_second);
  const temp = column(Variable.temperature, Unit.celsius);
  const pressure = column(Variable.pressure_msl, Unit.hectopascal);
  const precip = column(Variable.precipitation, Unit.millimetre);
  const cloud = column(Variable.cloud_cover, Unit.percentage);
  const radiation = column(Variable.shortwave_radiation, Unit.watt_per_square_metre);
  const code = column(Variable.weather_code, Unit.wmo_code);
  const hours = instants.map((at, index) => {
    const weatherCode = valueAt(code, index);
    return {
      at,
      windFromDeg: valueAt(from, index),
      windSpeedMps: valueAt(speed, index),
      gustMps: valueAt(gust, index),
      tempC: valueAt(temp, index),
      pressureHpa: valueAt(pressure, index),
      precipMm: valueAt(precip, index),
      cloudPercent: valueAt(cloud, index),
      radiationWm2: valueAt(radiation, index),
      thunder: weatherCode !== null && weatherCode >= THUNDER_FROM && weatherCode <= THUNDER_TO,
    };
  });
  if (hours.filter((hour) => hour.windSpeedMps !== null).length * 2 < hours.length) {
    return { ok: false, problem: ANSWER_PROBLEMS.mostlyNoWind };
  }
  return parsed(z.array(hourSchema), hours);
}

/** Ensemble members on the forecast's own instants; hours the ensemble lacks are not given. */
export function checkMembers(
  answer: DecodedAnswer | null,
  place: WeatherPlace,
  now: number,
  at: number[],
): Checked<EnsembleMember[]> {
  const framed = checkFrame(answer, place, forecastSpan(now));
  if (!framed.ok) return framed;
  const { instants, variables } = framed.value;
  const indexOf = new Map(instants.map((instant, index) => [instant, index]));
  const members: EnsembleMember[] = [];
  for (const member of new Set(variables.map((one) => one.member))) {
    const speed = findColumn(variables, Variable.wind_speed, Unit.metre_per_second, member, instants.length);
    const from = findColumn(variables, Variable.wind_direction, Unit.degree_direction, member, instants.length);
    if (!speed || !from) continue;
    const hours = at.map((instant) => {
      const index = indexOf.get(instant) ?? -1;
      return { at: instant, windFromDeg: valueAt(from, index), windSpeedMps: valueAt(speed, index) };
    });
    if (hours.some((hour) => hour.windSpeedMps !== null)) members.push({ id: `m${member}`, hours });
  }
  return parsed(z.array(z.object({ id: z.string(), hours: z.array(memberHourSchema) })), members);
}

function checkFrame(answer: DecodedAnswer | null, place: WeatherPlace, span: AnswerSpan) {
  if (!answer) return { ok: false, problem: ANSWER_PROBLEMS.noHours } as const;
  const frame = frameSchema(place, span).safeParse(answer);
  if (!frame.success) return { ok: false, problem: firstProblem(frame.error) } as const;
  const { startS, endS } = frame.data;
  const instants = Array.from({ length: (endS - startS) / HOUR_S }, (_, index) => (startS + index * HOUR_S) * 1000);
  return { ok: true, value: { instants, variables: answer.variables } } as const;
}

function findColumn(all: DecodedVariable[], variable: number, unit: number, member: number, length: number) {
  const found = all.find((one) => one.variable === variable && one.unit === unit && one.member === member);
  return found?.values.length === length ? found.values : null;
}

/** Values come as 32-bit floats: three decimals are more than they are worth. NaN is the service's "not given". */
function valueAt(column: number[] | null, index: number): number | null {
  const value = column?.[index];
  return value === undefined || Number.isNaN(value) ? null : Math.round(value * 1000) / 1000;
}

function parsed<T>(schema: z.ZodType<T>, value: unknown): Checked<T> {
  const result = schema.safeParse(value);
  return result.success ? { ok: true, value: result.data } : { ok: false, problem: firstProblem(result.error) };
}

function firstProblem(error: z.ZodError): string {
  const issue = error.issues[0];
  return issue ? `${issue.path.join('.')}: ${issue.message}` : ANSWER_PROBLEMS.noForecast;
}
