import { describe, expect, it } from 'vitest';
import { proposeZone, zoneChoices } from './propose-zone';

describe('proposeZone', () => {
  // IANA tz database, zone1970.tab: principal places of each zone.
  it.each([
    ['40.7142', '-74.0064', 'America/New_York'],
    ['41.85', '-87.65', 'America/Chicago'],
    ['33.4483', '-112.0733', 'America/Phoenix'],
    ['39.7683', '-86.1581', 'America/Indiana/Indianapolis'],
    ['51.5083', '-0.1253', 'Europe/London'],
  ])('knows the zone at %s, %s', async (lat, lon, zone) => {
    expect(await proposeZone(lat, lon)).toBe(zone);
  });

  it.each([
    ['', '-84'],
    ['north', '-84'],
    ['91', '0'],
    ['34', '200'],
  ])('proposes nothing for %j, %j', async (lat, lon) => {
    expect(await proposeZone(lat, lon)).toBeNull();
  });
});

describe('zoneChoices', () => {
  it('puts in a name the list lacks, and only then', () => {
    expect(zoneChoices(['A/B'], 'C/D')).toEqual(['C/D', 'A/B']);
    expect(zoneChoices(['A/B'], 'A/B')).toEqual(['A/B']);
    expect(zoneChoices(['A/B'], '')).toEqual(['A/B']);
  });
});
