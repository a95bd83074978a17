import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { chooseWeather } from './choose';
import { makeReplayWeather } from './replay';

const folder = mkdtempSync(join(tmpdir(), 'windrest-replay-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const PLACE = { lat: 40, lon: -75 };
const at = (hour: number) => Date.UTC(2013, 10, 9, hour);

function fileOf(name: string, text: string): string {
  const file = join(folder, name);
  writeFileSync(file, text);
  return file;
}

const hours = fileOf(
  'hours.csv',
  [
    'time_utc,wind_from_deg,wind_speed_mph',
    ...[9, 10, 12, 13].map((h) => `2013-11-09T${String(h).padStart(2, '0')}:00:00Z,310,10`),
  ].join('\n'),
);

describe('replayed weather', () => {
  it('plays observed hours as a forecast of the instant given, gaps kept', async () => {
    const port = makeReplayWeather({ file: hours, issuedAt: () => at(0), fromAt: at(10), toAt: at(12) });
    const result = await port.forecast(PLACE);
    if (!result.ok) throw new Error(result.message);
    expect(result.forecast).toMatchObject({
      issuedAt: at(0),
      fetchedAt: at(0),
      source: 'Replay of hours.csv',
      members: [],
    });
    expect(result.forecast.hours.map((hour) => hour.at)).toEqual([at(10), at(12)]);
  });

  it('is chosen by replay:FILE, with the clock as its issue time unless one is given', async () => {
    const setting = { weather: `replay:${hours}` };
    const plain = chooseWeather(setting, { now: () => at(20) });
    expect(plain.source).toBe(setting.weather);
    expect(await plain.forecast(PLACE)).toMatchObject({ ok: true, forecast: { issuedAt: at(20) } });
    const given = chooseWeather(setting, { now: () => at(20), issuedAt: () => at(3) });
    expect(await given.forecast(PLACE)).toMatchObject({ ok: true, forecast: { issuedAt: at(3) } });
  });

  it('says what is wrong with a file that is missing or holds no hours', async () => {
    const missing = makeReplayWeather({ file: join(folder, 'none.csv'), issuedAt: () => at(0) });
    expect(await missing.forecast(PLACE)).toMatchObject({ ok: false, reason: 'unavailable' });
    const empty = makeReplayWeather({ file: fileOf('bad.csv', 'time_utc,wind\n'), issuedAt: () => at(0) });
    expect(await empty.forecast(PLACE)).toMatchObject({
      ok: false,
      reason: 'bad_answer',
      message: expect.stringContaining('Line 1'),
    });
  });
});

describe('chooseWeather', () => {
  it('names its port by the setting, so kept forecasts of two settings never mix', () => {
    expect(['fake', 'hosted'].map((weather) => chooseWeather({ weather }).source)).toEqual(['fake', 'hosted']);
  });
});
