import { Body, Equator, Horizon, Observer, SearchAltitude, SearchRiseSet } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import { apartDeg } from './angles';
import { addDays, localToUtc } from './day-time';
import { daylight, sunPosition, sunTimes } from './sun';

const MINUTE = 60_000;

/** Minutes between an instant and a clock on a fixed offset from UTC, as tables in standard time print it. */
function minutesOff(at: number | null, day: string, clock: string, offsetHours: number): number {
  const printed = Date.parse(`${day}T${clock}:00Z`) - offsetHours * 3_600_000;
  return Math.abs(Math.round((at ?? Number.NaN) / MINUTE) - printed / MINUTE);
}

const BUFORD = { lat: 34 + 7 / 60, lon: -84, zone: 'America/New_York', offset: -5 };
const SAN_FRANCISCO = { lat: 37 + 46 / 60, lon: -(122 + 26 / 60), zone: 'America/Los_Angeles', offset: -8 };

describe('sunTimes against the US Naval Observatory', () => {
  // USNO one-year tables (local standard time), Buford GA 2016 and San Francisco CA 2012.
  it.each([
    [BUFORD, '2016-01-01', '07:42', '17:37'],
    [BUFORD, '2016-03-12', '06:50', '18:42'],
    [BUFORD, '2016-03-13', '06:49', '18:43'],
    [BUFORD, '2016-06-21', '05:25', '19:51'],
    [BUFORD, '2016-09-10', '06:16', '18:49'],
    [BUFORD, '2016-10-15', '06:42', '18:01'],
    [BUFORD, '2016-11-05', '07:00', '17:39'],
    [BUFORD, '2016-11-06', '07:01', '17:38'],
    [BUFORD, '2016-11-15', '07:09', '17:32'],
    [BUFORD, '2016-12-21', '07:38', '17:31'],
    [SAN_FRANCISCO, '2012-03-11', '06:26', '18:14'],
    [SAN_FRANCISCO, '2012-11-04', '06:39', '17:07'],
    [SAN_FRANCISCO, '2012-12-31', '07:25', '17:01'],
  ])('%o on %s rises %s and sets %s within a minute', (place, day, rise, set) => {
    const sun = sunTimes(day, place.zone, place.lat, place.lon);
    expect(minutesOff(sun.rise, day, rise, place.offset)).toBeLessThanOrEqual(1);
    expect(minutesOff(sun.set, day, set, place.offset)).toBeLessThanOrEqual(1);
    expect(sun.polar).toBe('none');
  });

  // Bluffton OH: to the second, as quoted from USNO in the Skyfield almanac's tests.
  it.each([
    ['2018-09-12', '11:13:12', '23:49:38'],
    ['2018-09-13', '11:14:12', '23:47:56'],
  ])('Bluffton OH on %s within a minute, in UTC', (day, rise, set) => {
    const sun = sunTimes(day, 'America/New_York', 40.8939, -83.8917);
    expect(Math.abs((sun.rise ?? 0) - Date.parse(`${day}T${rise}Z`))).toBeLessThanOrEqual(MINUTE);
    expect(Math.abs((sun.set ?? 0) - Date.parse(`${day}T${set}Z`))).toBeLessThanOrEqual(MINUTE);
  });

  // Two independent programs that agree to the minute: civil dawn, rise, set, civil dusk in local standard time.
  it.each([
    ['Bluffton OH', 40.8939, -83.8917, 'America/New_York', -4, '2020-04-19', '06:21', '06:50', '20:20', '20:49'],
    ['Duluth MN', 46.7867, -92.1005, 'America/Chicago', -6, '2025-11-08', '06:29', '07:01', '16:42', '17:15'],
    ['Marquette MI', 46.5436, -87.3954, 'America/Detroit', -5, '2025-11-15', '07:19', '07:52', '17:16', '17:49'],
    ['Missoula MT', 46.8721, -113.994, 'America/Denver', -7, '2025-10-25', '06:37', '07:09', '17:30', '18:02'],
    ['Bangor ME', 44.8016, -68.7712, 'America/New_York', -5, '2025-11-02', '05:44', '06:15', '16:22', '16:52'],
    ['Anchorage AK', 61.2181, -149.9003, 'America/Anchorage', -9, '2025-11-02', '07:44', '08:32', '16:54', '17:41'],
    ['Key West FL', 24.5551, -81.78, 'America/New_York', -5, '2025-11-02', '06:11', '06:35', '17:46', '18:10'],
  ])('%s', (_name, lat, lon, zone, offset, day, dawn, rise, set, dusk) => {
    const sun = sunTimes(day, zone, lat, lon);
    expect(minutesOff(sun.civilDawn, day, dawn, offset)).toBeLessThanOrEqual(1);
    expect(minutesOff(sun.rise, day, rise, offset)).toBeLessThanOrEqual(1);
    expect(minutesOff(sun.set, day, set, offset)).toBeLessThanOrEqual(1);
    expect(minutesOff(sun.civilDusk, day, dusk, offset)).toBeLessThanOrEqual(1);
  });

  // Willson 1908 (Harvard Univ. Press), map reading, Central standard time.
  it.each([
    ['Springfield IL', 39.7817, -89.6501, '07:20'],
    ['Toledo OH', 41.6528, -83.5379, '07:00'],
  ])('%s on 1 January by Willson', (_name, lat, lon, rise) => {
    expect(minutesOff(sunTimes('1908-01-01', 'Etc/GMT+6', lat, lon).rise, '1908-01-01', rise, -6)).toBeLessThanOrEqual(
      1,
    );
  });
});

describe('the polar day and night', () => {
  it('is said, without a rise or a set', () => {
    // Skyfield's almanac examples: Utqiagvik AK has no sunset, Harra in Sweden no sunrise on these days.
    const up = sunTimes('2023-06-21', 'America/Anchorage', 71.2906, -156.7886);
    expect(up).toMatchObject({ rise: null, set: null, polar: 'up_all_day' });
    for (const day of ['2022-12-20', '2022-12-21', '2022-12-22', '2022-12-23']) {
      const down = sunTimes(day, 'Europe/Stockholm', 67.4066, 20.0997);
      expect(down).toMatchObject({ rise: null, set: null, polar: 'down_all_day' });
      expect(down.civilDawn).not.toBeNull();
    }
    expect(daylight('2023-06-21', { lat: 71.2906, lon: -156.7886, zone: 'America/Anchorage' })).toBeNull();
  });

  it('leaves the events of a northern summer on the day on which they fall', () => {
    // Fairbanks AK in June: the sun sets after midnight, so the set of the day comes before its rise.
    const place = { lat: 64.8378, lon: -147.7164, zone: 'America/Anchorage' };
    const sun = sunTimes('2024-06-21', place.zone, place.lat, place.lon);
    expect(sun.set ?? 0).toBeLessThan(sun.rise ?? 0);
    expect(sun.set ?? 0).toBeGreaterThanOrEqual(localToUtc('2024-06-21', '00:00', place.zone));
    const light = daylight('2024-06-21', place);
    expect((light?.set ?? 0) - (light?.rise ?? 0)).toBeGreaterThan(21 * 60 * MINUTE);
  });
});

const PLACES = [
  [24.5551, -81.78, 'America/New_York'],
  [34.1167, -84, 'America/New_York'],
  [46.5436, -87.3954, 'America/Detroit'],
  [-37.8, 144.95, 'Australia/Melbourne'],
  [58.3, -134.4, 'America/Juneau'],
] as const;
const DAYS = Array.from({ length: 24 }, (_, i) => addDays('2026-01-05', i * 15));

describe('against astronomy-engine, an independent program', () => {
  it.each(PLACES)('rise, set and civil twilight within 60 s at %d, %d', (lat, lon, zone) => {
    const observer = new Observer(lat, lon, 0);
    for (const day of DAYS) {
      const midnight = new Date(localToUtc(day, '00:00', zone));
      const sun = sunTimes(day, zone, lat, lon);
      const events = [
        [sun.rise, SearchRiseSet(Body.Sun, observer, 1, midnight, 1)],
        [sun.set, SearchRiseSet(Body.Sun, observer, -1, midnight, 1)],
        [sun.civilDawn, SearchAltitude(Body.Sun, observer, 1, midnight, 1, -6)],
        [sun.civilDusk, SearchAltitude(Body.Sun, observer, -1, midnight, 1, -6)],
      ] as const;
      for (const [ours, theirs] of events) {
        expect(Math.abs((ours ?? Number.NaN) - (theirs?.date.getTime() ?? Number.NaN))).toBeLessThan(MINUTE);
      }
    }
  });

  it.each(PLACES)('position within 0.05 degrees of arc at %d, %d', (lat, lon, zone) => {
    const observer = new Observer(lat, lon, 0);
    let compared = 0;
    for (const day of DAYS) {
      for (const clock of ['06:30', '08:00', '10:30', '15:00', '17:45']) {
        const at = localToUtc(day, clock, zone);
        const equator = Equator(Body.Sun, new Date(at), observer, true, true);
        const theirs = Horizon(new Date(at), observer, equator.ra, equator.dec, 'normal');
        if (theirs.altitude < 1) continue;
        const ours = sunPosition(at, lat, lon);
        compared++;
        expect(Math.abs(ours.altitudeDeg - theirs.altitude)).toBeLessThan(0.05);
        expect(apartDeg(ours.azimuthDeg, theirs.azimuth) * Math.cos((theirs.altitude * Math.PI) / 180)).toBeLessThan(
          0.05,
        );
      }
    }
    expect(compared).toBeGreaterThan(60);
  });
});
