import { HttpResponse, http } from 'msw';
import { setupServer } from 'msw/node';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { apartDeg } from '@/core/angles';
import { type FakeWeatherOptions, makeWeatherHandlers } from './fake/handlers';
import { latestRun, MEMBER_COUNT, makeForecast } from './fake/make-forecast';
import { makeHostedWeather } from './hosted';

const PLACE = { lat: 34.1234, lon: -83.9876 };
const NOW = Date.UTC(2025, 10, 14, 9, 20);
const HOUR = 3_600_000;
const KEY = 'a-secret-key';

const server = setupServer();
beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
afterEach(() => server.resetHandlers());
afterAll(() => server.close());

const serve = (options: Partial<FakeWeatherOptions> = {}) =>
  server.use(...makeWeatherHandlers({ now: () => NOW, ...options }));

const port = (over: { timeLimitMs?: number } = {}) =>
  makeHostedWeather({
    forecastUrl: 'https://weather.test/v1/forecast',
    ensembleUrl: 'https://members.test/v1/ensemble',
    archiveUrl: 'https://past.test/v1/archive',
    apiKey: KEY,
    source: 'hosted',
    label: 'Test weather',
    now: () => NOW,
    ...over,
  });

describe('the hosted weather through the SDK', () => {
  it('gives every variable of every hour as it was made', async () => {
    serve();
    const result = await port().forecast(PLACE);
    if (!result.ok) throw new Error(result.message);
    const { forecast } = result;
    expect(forecast).toMatchObject({ issuedAt: latestRun(NOW), fetchedAt: NOW, source: 'Test weather' });
    expect(forecast.hours).toHaveLength(10 * 24);
    expect(forecast.hours[0]?.at).toBe(Date.UTC(2025, 10, 13));
    for (const hour of forecast.hours) {
      const made = makeForecast({ lat: 34.1234, lon: -83.9876 }, latestRun(NOW), hour.at);
      expect(apartDeg(hour.windFromDeg ?? 0, made.windFromDeg)).toBeLessThan(0.001);
      expect(hour.windSpeedMps).toBeCloseTo(made.windSpeedMps, 2);
      expect(hour.gustMps).toBeCloseTo(made.gustMps, 2);
      expect(hour.tempC).toBeCloseTo(made.tempC, 2);
      expect(hour.pressureHpa).toBeCloseTo(made.pressureHpa, 2);
      expect(hour.precipMm).toBeCloseTo(made.precipMm, 2);
      expect(hour.cloudPercent).toBeCloseTo(made.cloudPercent, 2);
      expect(hour.radiationWm2).toBeCloseTo(made.radiationWm2, 2);
      expect(hour.thunder).toBe(made.weatherCode >= 95);
    }
  });

  it('gives every member on the same instants', async () => {
    serve();
    const result = await port().forecast(PLACE);
    if (!result.ok) throw new Error(result.message);
    const { hours, members } = result.forecast;
    expect(members.map((member) => member.id)).toEqual(
      Array.from({ length: MEMBER_COUNT + 1 }, (_, index) => `m${index}`),
    );
    for (const [index, member] of members.entries()) {
      expect(member.hours.map((hour) => hour.at)).toEqual(hours.map((hour) => hour.at));
      const last = member.hours.at(-1);
      const made = makeForecast(PLACE, latestRun(NOW), last?.at ?? 0, index);
      expect(apartDeg(last?.windFromDeg ?? 0, made.windFromDeg)).toBeLessThan(0.001);
      expect(last?.windSpeedMps).toBeCloseTo(made.windSpeedMps, 2);
    }
  });

  it('gives the hours of past days from the archive alone, both days inside', async () => {
    const asked: string[] = [];
    serve({ onRequest: (kind, url) => asked.push(`${kind} ${url.searchParams.get('start_date')}`) });
    const result = await port().history(PLACE, { fromDay: '2024-09-01', toDay: '2025-01-31' });
    if (!result.ok) throw new Error(result.message);
    const { hours, members, source } = result.forecast;
    expect(asked).toEqual(['archive 2024-09-01']);
    expect([members, source]).toEqual([[], 'Test weather, past hours']);
    expect(hours).toHaveLength(153 * 24);
    expect(hours[0]?.at).toBe(Date.UTC(2024, 8, 1));
    const [first] = hours;
    const made = makeForecast(PLACE, first?.at ?? 0, first?.at ?? 0);
    expect(apartDeg(first?.windFromDeg ?? 0, made.windFromDeg)).toBeLessThan(0.001);
  });

  it('says so when the archive fails or is for another place', async () => {
    const days = { fromDay: '2024-09-01', toDay: '2024-09-30' };
    serve({ archive: 'wrong_place' });
    expect(await port().history(PLACE, days)).toMatchObject({ ok: false, reason: 'bad_answer' });
    server.resetHandlers();
    serve({ archive: 'limit' });
    expect(await port().history(PLACE, days)).toMatchObject({ ok: false, reason: 'limit' });
  });

  it('asks each service once, for metres per second, with the key', async () => {
    const asked: [string, URL][] = [];
    serve({ onRequest: (kind, url) => asked.push([kind, url]) });
    await port().forecast(PLACE);
    expect(asked.map(([kind]) => kind).sort()).toEqual(['ensemble', 'forecast']);
    for (const [, url] of asked) {
      expect(url.searchParams.get('wind_speed_unit')).toBe('ms');
      expect(url.searchParams.get('apikey')).toBe(KEY);
      expect(url.searchParams.get('latitude')).toBe('34.1234');
      expect(Number(url.searchParams.get('forecast_days'))).toBeGreaterThanOrEqual(7);
      expect(url.searchParams.get('past_days')).toBe('1');
    }
  });

  it.each(['not_found', 'busy', 'limit', 'broken', 'cut', 'wrong_place', 'no_wind'] as const)(
    'keeps the plain forecast when the ensemble answers %s',
    async (trouble) => {
      serve({ ensemble: trouble });
      const result = await port().forecast(PLACE);
      expect(result.ok && result.forecast.hours.length).toBe(240);
      expect(result.ok && result.forecast.members).toEqual([]);
    },
  );

  it.each([
    ['not_found', 'bad_answer'],
    ['busy', 'bad_answer'],
    ['limit', 'limit'],
    ['broken', 'unavailable'],
    ['cut', 'bad_answer'],
    ['wrong_place', 'bad_answer'],
    ['no_wind', 'bad_answer'],
  ] as const)('refuses an answer that is %s as %s, in plain words without the key', async (trouble, reason) => {
    let asked = 0;
    serve({ forecast: trouble, onRequest: (kind) => (asked += kind === 'forecast' ? 1 : 0) });
    const result = await port().forecast(PLACE);
    expect(result).toMatchObject({ ok: false, reason });
    expect(JSON.stringify(result)).not.toContain(KEY);
    expect(JSON.stringify(result)).not.toContain('weather.test');
    expect(asked).toBe(1);
  });

  it('reads a missing value as not given', async () => {
    serve({ forecast: 'some_wind' });
    const result = await port().forecast(PLACE);
    if (!result.ok) throw new Error(result.message);
    const missing = result.forecast.hours.filter((hour) => hour.windSpeedMps === null);
    expect(missing).toHaveLength(48);
    expect(missing.every((hour) => hour.windFromDeg === null && hour.tempC === null && !hour.thunder)).toBe(true);
  });

  it('refuses an answer made for another week', async () => {
    serve({ now: () => NOW - 30 * 24 * HOUR });
    expect(await port().forecast(PLACE)).toMatchObject({ ok: false, reason: 'bad_answer' });
  });

  it.each([
    ['an empty body', new Uint8Array(0)],
    ['zeros', new Uint8Array(64)],
    ['noise', Uint8Array.from({ length: 4000 }, (_, index) => (index * 73 + 41) % 97)],
  ])('refuses %s', async (_, body) => {
    server.use(http.get('*/v1/*', () => HttpResponse.arrayBuffer(body.buffer)));
    expect(await port().forecast(PLACE)).toMatchObject({ ok: false, reason: 'bad_answer' });
  });

  it('says so when the service cannot be reached', async () => {
    server.use(http.get('*/v1/*', () => HttpResponse.error()));
    expect(await port().forecast(PLACE)).toMatchObject({ ok: false, reason: 'unavailable' });
  });

  it('gives up when the caller does, and at its own time limit', async () => {
    server.use(http.get('*/v1/*', () => new Promise<never>(() => {})));
    const given = AbortSignal.abort();
    expect(await port().forecast(PLACE, given)).toMatchObject({ ok: false, reason: 'unavailable' });
    const result = await port({ timeLimitMs: 20 }).forecast(PLACE);
    expect(result).toMatchObject({ ok: false, reason: 'unavailable', message: expect.stringContaining('in time') });
  });
});
