import { describe, expect, it } from 'vitest';
import type { ImportedThing } from '@/db/schema';
import type { MapThing } from '@/features/map/thing';
import { fateOf, fateText } from './fate';
import { FreshNames } from './fresh-names';
import { guessKind } from './guess-kind';
import { reviewThings } from './review';

const club = { slug: 'c', name: 'C', lat: 34.1, lon: -84, units: 'us' as const };
/** About 11.1 m to the north. */
const STEP = 1e-4;

const point = (name: string, lat: number, lon = -84): ImportedThing => ({
  name,
  notes: '',
  told: '',
  geometry: { type: 'Point', coordinates: [lon, lat] },
  problem: null,
  remarks: [],
});

const stand: MapThing = {
  kind: 'stand',
  id: 'std_1',
  version: 1,
  name: 'Old oak',
  geometry: { type: 'Point', coordinates: [-84, 34.1] },
  what: 'ladder',
  arcs: [],
  closed: '',
};

const on = { club, things: [stand] };

describe('guessing kinds', () => {
  it.each([
    ['Ladder by the creek', 'point', 'stand:ladder'],
    ['trailCam_2', 'point', 'item:camera'],
    ['North bedding', 'area', 'feature:bedding'],
    ['North bedding', 'line', ''],
    ['Creek', 'line', 'feature:water'],
    ['Swamp edge', 'area', 'item:swamp'],
    ['Walk in from gate', 'line', 'approach'],
    ['Corn 2026', 'area', 'feature:crop'],
    ['Property line', 'area', 'item:boundary'],
    ['WPT 014', 'point', ''],
  ] as const)('%s as %s', (name, shape, kind) => {
    expect(guessKind({ name, told: '', notes: '' }, shape)).toBe(kind);
  });

  it('believes a kind of our own before any word, when the shape fits it', () => {
    expect(guessKind({ name: 'Ladder', told: 'area item:wood', notes: '' }, 'area')).toBe('item:wood');
    expect(guessKind({ name: 'Scrape', told: 'item:wood', notes: '' }, 'point')).toBe('feature:scrape');
  });
});

describe('rows', () => {
  it('finds a twin on the map by distance, for the same family only', () => {
    const [row, far] = reviewThings(
      [point('Ladder stand', 34.1 + STEP / 2), point('Ladder two', 34.1 + 2 * STEP)],
      false,
      on,
    );
    if (!row || !far) throw new Error('No rows.');
    expect(fateOf(row, row.kind)).toBe('twin');
    expect(fateText(row, row.kind, 'us')).toBe('Old oak is there already, 6 yd away.');
    expect(fateOf(row, 'feature:scrape')).toBe('ready');
    expect(fateOf(far, far.kind)).toBe('ready');
  });

  it('finds a twin in the file itself', () => {
    const [, second] = reviewThings([point('Scrape a', 34.12), point('Scrape b', 34.12)], false, on);
    expect(second && fateText(second, second.kind, 'us')).toBe('Row 1, Scrape a, is the same, 0 yd away.');
  });

  it('knows a line drawn the other way, and one that runs on, apart', () => {
    const line = (coordinates: number[][]): ImportedThing => ({
      ...point('Trail', 0),
      geometry: { type: 'LineString', coordinates },
    });
    const path = [
      [-84, 34.1],
      [-84.001, 34.101],
      [-84.002, 34.1],
    ];
    const rows = reviewThings([line(path), line(path.toReversed()), line([...path, [-84.01, 34.1]])], false, on);
    expect(rows.map((row) => row.twins.map((twin) => twin.row))).toEqual([[], [1], []]);
  });

  it('tells places far off, and takes them when they were only swapped', () => {
    const swapped = [point('A', -84, 34.1)];
    expect(reviewThings(swapped, false, on)[0]?.problem).toContain('did you swap latitude and longitude');
    expect(reviewThings(swapped, true, on)[0]?.problem).toBeNull();
  });
});

it('numbers names that are taken, whatever their case', () => {
  const names = new FreshNames(['Oak', 'oak 2', 'Stand 1']);
  expect([
    names.take('OAK', 'Stand'),
    names.take('OAK', 'Stand'),
    names.take('', 'Stand'),
    names.take('Elm', 'Stand'),
  ]).toEqual(['OAK 3', 'OAK 4', 'Stand 2', 'Elm']);
  expect(names.take('x'.repeat(60), 'Stand')).toHaveLength(60);
  expect(names.take('x'.repeat(60), 'Stand')).toMatch(/^x{58} 2$/);
});
