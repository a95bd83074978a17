import { z } from 'zod';
import { type ElevationPort, type ElevationResult, elevationFailure, MOST_AT_ONCE } from './port';
import { ELEVATION_FAULTS } from './words';

export interface HostedElevationOptions {
  /** The whole address, such as https://host/v1/elevation. */
  url: string;
  apiKey?: string | undefined;
  source: string;
  label: string;
  timeLimitMs?: number | undefined;
}

const TIME_LIMIT_MS = 10_000;
/** Lower than the Dead Sea's shore and higher than any summit there is none. */
const answerShape = z.object({ elevation: z.array(z.number().min(-500).max(9000)) });

/** Heights of the hosted service (Open-Meteo's elevation API, Copernicus GLO-90); the fake answers the same requests. */
export function makeHostedElevation(options: HostedElevationOptions): ElevationPort {
  return {
    source: options.source,
    label: options.label,
    heights: async (places, signal): Promise<ElevationResult> => {
      if (places.length === 0) return { ok: true, heightsM: [] };
      if (places.length > MOST_AT_ONCE) return elevationFailure('bad_answer', ELEVATION_FAULTS.tooMany);
      const url = new URL(options.url);
      url.searchParams.set('latitude', places.map(({ lat }) => lat.toFixed(6)).join(','));
      url.searchParams.set('longitude', places.map(({ lon }) => lon.toFixed(6)).join(','));
      if (options.apiKey) url.searchParams.set('apikey', options.apiKey);
      const limit = AbortSignal.timeout(options.timeLimitMs ?? TIME_LIMIT_MS);
      try {
        const response = await fetch(url, { signal: signal ? AbortSignal.any([signal, limit]) : limit });
        if (response.status === 429) return elevationFailure('limit', ELEVATION_FAULTS.tooOften);
        if (!response.ok) return elevationFailure('unavailable', ELEVATION_FAULTS.outOfOrder);
        const parsed = answerShape.safeParse(await response.json().catch(() => null));
        if (!parsed.success || parsed.data.elevation.length !== places.length) {
          return elevationFailure('bad_answer', ELEVATION_FAULTS.badAnswer);
        }
        return { ok: true, heightsM: parsed.data.elevation };
      } catch {
        return elevationFailure('unavailable', ELEVATION_FAULTS.noAnswer);
      }
    },
  };
}
