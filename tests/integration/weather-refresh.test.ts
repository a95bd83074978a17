import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { chooseWeather } from '@/adapters/weather/choose';
import { latestRun } from '@/adapters/weather/fake/make-forecast';
import { stopFakeWeather } from '@/adapters/weather/fake/serve';
import { type WeatherPlace, type WeatherPort, type WeatherResult, weatherFailure } from '@/adapters/weather/port';
import { DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import type { Forecast } from '@/core/condition-types';
import { write } from '@/db/client';
import { clubs, forecasts } from '@/db/schema';
import { ensureForecast } from '@/features/weather/ensure-forecast';
import { getForecast } from '@/features/weather/get-forecast';
import { refreshAllForecasts } from '@/features/weather/refresh-all';
import { refreshForecast } from '@/features/weather/refresh-forecast';
import { newId } from '@/lib/ids';

const HOUR = 3_600_000;
const NOW = Date.UTC(2025, 10, 14, 9, 20);
const PLACE = { lat: 34.1234, lon: -83.9876 };

function forecastAt(issuedAt: number): Forecast {
  const hours = Array.from({ length: 48 }, (_, index) => ({
    at: issuedAt + index * HOUR,
    windFromDeg: index === 3 ? null : (index * 7) % 360,
    windSpeedMps: 3,
    gustMps: null,
    tempC: 4.5,
    pressureHpa: 1018,
    precipMm: 0,
    cloudPercent: 20,
    radiationWm2: 100,
    thunder: index === 5,
  }));
  return { issuedAt, fetchedAt: issuedAt, source: 'counted', hours, members: [] };
}

/** A port that counts requests and answers when it is let. */
function countedPort(answer: () => WeatherResult | Promise<WeatherResult>) {
  const asked: WeatherPlace[] = [];
  const port: WeatherPort = {
    source: 'counted',
    forecast: async (place) => {
      asked.push(place);
      return answer();
    },
    history: () => Promise.reject(new Error('No past hours are asked for here.')),
  };
  return { port, asked };
}

const good = (issuedAt = NOW): WeatherResult => ({ ok: true, forecast: forecastAt(issuedAt) });
const bad = weatherFailure('unavailable', 'The weather service cannot be reached or is out of order.');

beforeEach(async () => {
  await write(async (tx) => {
    await tx.delete(forecasts);
    await tx.delete(clubs);
  });
});
afterAll(stopFakeWeather);

describe('refreshing a forecast', () => {
  it('makes one request for 20 who ask at once, and none in the hour after', async () => {
    const { port, asked } = countedPort(() => good());
    const outcomes = await Promise.all(Array.from({ length: 20 }, () => refreshForecast(PLACE, NOW, port)));
    expect(asked).toEqual([{ lat: 34.12, lon: -83.99 }]);
    expect(outcomes.filter(({ status }) => status === 'refreshed')).toHaveLength(1);
    expect(await refreshForecast(PLACE, NOW + HOUR - 1, port)).toEqual({ status: 'not_due' });
    expect(asked).toHaveLength(1);
    expect(await refreshForecast(PLACE, NOW + HOUR, port)).toEqual({ status: 'refreshed' });
    expect(asked).toHaveLength(2);
  });

  it('keeps what it got, and reads it back the same with its age', async () => {
    const { port } = countedPort(() => good(NOW - 2 * HOUR));
    await refreshForecast(PLACE, NOW, port);
    const kept = await getForecast(PLACE, NOW + HOUR, 'counted');
    expect(kept.forecast).toEqual({ ...forecastAt(NOW - 2 * HOUR), fetchedAt: NOW });
    expect(kept).toMatchObject({ ageMs: HOUR, stale: false, error: null });
    expect((await getForecast(PLACE, NOW + 4 * HOUR, 'counted')).stale).toBe(true);
    expect((await getForecast(PLACE, NOW, 'other')).forecast).toBeNull();
  });

  it('keeps the old forecast when a request fails, says why, and waits longer each time', async () => {
    let answer: WeatherResult = good();
    const { port, asked } = countedPort(() => answer);
    await refreshForecast(PLACE, NOW, port);
    answer = bad;
    const first = NOW + HOUR;
    expect(await refreshForecast(PLACE, first, port)).toEqual({ status: 'failed', message: bad.message });
    const kept = await getForecast(PLACE, first, 'counted');
    expect(kept.forecast?.hours).toHaveLength(48);
    expect(kept.error).toBe(bad.message);
    expect(await refreshForecast(PLACE, first + HOUR - 1, port)).toEqual({ status: 'not_due' });
    expect((await refreshForecast(PLACE, first + HOUR, port)).status).toBe('failed');
    expect(await refreshForecast(PLACE, first + 2 * HOUR, port)).toEqual({ status: 'not_due' });
    answer = good(first + 3 * HOUR);
    expect((await refreshForecast(PLACE, first + 3 * HOUR, port)).status).toBe('refreshed');
    expect((await getForecast(PLACE, first + 3 * HOUR, 'counted')).error).toBeNull();
    expect(asked).toHaveLength(4);
  });

  it('ends the lease of a port that throws', async () => {
    const { port } = countedPort(() => Promise.reject(new Error('broken port')));
    expect((await refreshForecast(PLACE, NOW, port)).status).toBe('failed');
    expect(await refreshForecast(PLACE, NOW + 1, port)).toEqual({ status: 'not_due' });
  });

  it('does not let a process that lost its lease overwrite a later answer', async () => {
    let answerFirst = (_: WeatherResult) => {};
    const slow = countedPort(() => new Promise<WeatherResult>((done) => (answerFirst = done)));
    const first = refreshForecast(PLACE, NOW, slow.port);
    await expect.poll(() => slow.asked.length).toBe(1);
    expect(await refreshForecast(PLACE, NOW + 1, slow.port)).toEqual({ status: 'busy' });
    const { port } = countedPort(() => good(NOW + HOUR));
    await refreshForecast(PLACE, NOW + HOUR, port);
    answerFirst(good(NOW));
    await first;
    expect((await getForecast(PLACE, NOW + HOUR, 'counted')).forecast?.issuedAt).toBe(NOW + HOUR);
  });
});

describe('the forecast for a list', () => {
  it('asks when none is kept, and not again while it is fresh', async () => {
    const { port, asked } = countedPort(() => good());
    const both = await Promise.all([ensureForecast(PLACE, NOW, { port }), ensureForecast(PLACE, NOW, { port })]);
    expect(both.map((kept) => kept.forecast?.hours.length)).toEqual([48, 48]);
    await ensureForecast(PLACE, NOW + 30 * 60_000, { port });
    expect(asked).toHaveLength(1);
  });

  it('gives the old one, with its age, when the service is slow; the answer is kept for the next reader', async () => {
    let late = (_: WeatherResult) => {};
    let answer: () => WeatherResult | Promise<WeatherResult> = () => good();
    const { port } = countedPort(() => answer());
    await refreshForecast(PLACE, NOW, port);
    answer = () => new Promise<WeatherResult>((done) => (late = done));
    const later = NOW + 5 * HOUR;
    const kept = await ensureForecast(PLACE, later, { port, waitMs: 20 });
    expect(kept).toMatchObject({ ageMs: 5 * HOUR, stale: true });
    expect(kept.forecast?.issuedAt).toBe(NOW);
    late(good(later));
    await expect.poll(async () => (await getForecast(PLACE, later, 'counted')).forecast?.issuedAt).toBe(later);
  });

  it('gives none, with the reason, when there is nothing', async () => {
    const { port } = countedPort(() => bad);
    expect(await ensureForecast(PLACE, NOW, { port })).toEqual({
      forecast: null,
      ageMs: null,
      stale: false,
      error: bad.message,
    });
  });

  it('brings made weather through the SDK from the server on this machine', async () => {
    const port = chooseWeather({ weather: 'fake' }, { now: () => NOW });
    const { forecast, error } = await ensureForecast(PLACE, NOW, { port, waitMs: 60_000 });
    expect(error).toBeNull();
    expect(forecast?.issuedAt).toBe(latestRun(NOW));
    expect(forecast?.hours).toHaveLength(240);
    expect(forecast?.members.length).toBeGreaterThan(10);
  });
});

describe('the timed refresh', () => {
  it('asks once for each place that clubs share', async () => {
    const club = (slug: string, lat: number) => ({
      id: newId('club'),
      slug,
      name: slug,
      lat,
      lon: -84,
      zone: 'America/New_York',
      units: 'us' as const,
      rules: DEFAULT_CLUB_RULES,
      createdAt: NOW,
    });
    await write((tx) => tx.insert(clubs).values([club('one', 34.001), club('two', 34.002), club('three', 35)]));
    const { port, asked } = countedPort(() => good());
    expect(await refreshAllForecasts(NOW, port)).toEqual({ refreshed: 2, failed: 0, waiting: 0 });
    expect(await refreshAllForecasts(NOW + 1, port)).toEqual({ refreshed: 0, failed: 0, waiting: 2 });
    expect(asked).toHaveLength(2);
  });
});
