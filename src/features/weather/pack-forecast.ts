import { z } from 'zod';
import type { Forecast } from '@/core/condition-types';

/** Columns in place of rows: a tenth of the bytes, which every read of a list has to parse. */
const column = z.array(z.number().nullable());
const packedSchema = z.object({
  version: z.literal(1),
  at: z.array(z.number()),
  from: column,
  speed: column,
  gust: column,
  temp: column,
  pressure: column,
  precip: column,
  cloud: column,
  radiation: column,
  thunder: z.array(z.boolean()),
  members: z.array(z.object({ id: z.string(), from: column, speed: column })),
});

export type PackedForecast = z.infer<typeof packedSchema>;

export function packForecast(forecast: Forecast): PackedForecast {
  const { hours, members } = forecast;
  return {
    version: 1,
    at: hours.map((hour) => hour.at),
    from: hours.map((hour) => hour.windFromDeg),
    speed: hours.map((hour) => hour.windSpeedMps),
    gust: hours.map((hour) => hour.gustMps),
    temp: hours.map((hour) => hour.tempC),
    pressure: hours.map((hour) => hour.pressureHpa),
    precip: hours.map((hour) => hour.precipMm),
    cloud: hours.map((hour) => hour.cloudPercent),
    radiation: hours.map((hour) => hour.radiationWm2),
    thunder: hours.map((hour) => hour.thunder),
    members: members.map((member) => ({
      id: member.id,
      from: member.hours.map((hour) => hour.windFromDeg),
      speed: member.hours.map((hour) => hour.windSpeedMps),
    })),
  };
}

/** Null for a body that another version of the program wrote: it counts as no forecast. */
export function unpackForecast(
  body: unknown,
  kept: { issuedAt: number; fetchedAt: number; source: string },
): Forecast | null {
  const parsed = packedSchema.safeParse(body);
  if (!parsed.success) return null;
  const packed = parsed.data;
  return {
    ...kept,
    hours: packed.at.map((at, index) => ({
      at,
      windFromDeg: packed.from[index] ?? null,
      windSpeedMps: packed.speed[index] ?? null,
      gustMps: packed.gust[index] ?? null,
      tempC: packed.temp[index] ?? null,
      pressureHpa: packed.pressure[index] ?? null,
      precipMm: packed.precip[index] ?? null,
      cloudPercent: packed.cloud[index] ?? null,
      radiationWm2: packed.radiation[index] ?? null,
      thunder: packed.thunder[index] ?? false,
    })),
    members: packed.members.map((member) => ({
      id: member.id,
      hours: packed.at.map((at, index) => ({
        at,
        windFromDeg: member.from[index] ?? null,
        windSpeedMps: member.speed[index] ?? null,
      })),
    })),
  };
}
