import { DEFAULT_CLUB_RULES } from '../../src/core/booking/rules';
import type { Forecast, WeatherHour } from '../../src/core/condition-types';
import type {
  FeatureKind,
  LocalShape,
  Point,
  ScoredApproach,
  ScoredFeature,
  ScoredStand,
} from '../../src/core/ground-types';
import { FEATURE_KINDS, SHELTER_CLASSES, STAND_KINDS } from '../../src/core/ground-types';
import type { WeekInput } from '../../src/core/rank-input';
import { DEFAULT_SETTINGS } from '../../src/core/settings';
import { sitWindow, windowsFrom } from '../../src/core/windows';

const HOUR = 3_600_000;
const PLACE = { lat: 38.2, lon: -81.9, zone: 'America/New_York' };

/** Small seeded generator (mulberry32): the same world each run. */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

function makeForecast(first: number, hours: number, random: () => number): Forecast {
  let direction = 250;
  let speed = 4;
  const list: WeatherHour[] = [];
  for (let i = 0; i < hours; i++) {
    direction = (direction + 360 + (random() - 0.4) * 25) % 360;
    speed = Math.max(0.3, Math.min(11, speed + (random() - 0.5) * 1.6));
    const wet = random() < 0.08;
    list.push({
      at: first + i * HOUR,
      windFromDeg: random() < 0.03 ? null : direction,
      windSpeedMps: speed,
      gustMps: speed * 1.6,
      tempC: 5 + 6 * Math.sin(i / 4),
      pressureHpa: 1015,
      precipMm: wet ? random() * 5 : 0,
      cloudPercent: Math.round(random() * 100),
      radiationWm2: null,
      thunder: false,
    });
  }
  return { issuedAt: first, fetchedAt: first, source: 'made up', hours: list, members: [] };
}

/**
 * A made-up club: stands on a jittered grid of 300 yards, features of every kind over the same ground, one way in of
 * two points for each stand. 14 windows from one forecast of a week.
 */
export function makeWorld(standCount: number, featureCount: number): WeekInput {
  const random = seeded(7);
  const side = Math.ceil(Math.sqrt(standCount));
  const sizeM = side * 274;
  const somewhere = (): Point => ({ eastM: random() * sizeM, northM: random() * sizeM });
  const pick = <T>(list: readonly T[]): T => list[Math.floor(random() * list.length)] as T;
  const near = (p: Point, m: number): Point => ({
    eastM: p.eastM + (random() - 0.5) * 2 * m,
    northM: p.northM + (random() - 0.5) * 2 * m,
  });
  const shapeOf = (kind: FeatureKind): LocalShape => {
    const p = somewhere();
    if (kind === 'travel_line' || kind === 'rub_line') return { type: 'line', points: [p, near(p, 120), near(p, 200)] };
    if (kind === 'water' || kind === 'scrape' || kind === 'crossing') return { type: 'point', at: p };
    const r = 30 + random() * 60;
    const corners = [0, 1, 2, 3, 4, 5].map((i) => ({
      eastM: p.eastM + r * Math.cos(i) * (0.8 + random() * 0.4),
      northM: p.northM + r * Math.sin(i) * (0.8 + random() * 0.4),
    }));
    return { type: 'area', rings: [corners] };
  };
  const features = Array.from({ length: featureCount }, (_, i): ScoredFeature => {
    const kind = pick(FEATURE_KINDS);
    return { id: `f${i}`, name: `F${i}`, kind, shape: shapeOf(kind), months: [9, 10, 11, 12, 1], use: null };
  });
  const stands = Array.from({ length: standCount }, (_, i): ScoredStand => {
    const from = Math.floor(random() * 360);
    const grid = { eastM: ((i % side) + 0.5) * 274, northM: (Math.floor(i / side) + 0.5) * 274 };
    return {
      id: `s${i}`,
      name: `S${i}`,
      kind: pick(STAND_KINDS),
      at: near(grid, 60),
      seatHeightM: pick([0, 4, 5, 6]),
      facingDeg: random() < 0.7 ? Math.floor(random() * 360) : null,
      shotSide: 'either',
      shotRangeM: { bow: 27, rifle: 140 },
      shelter: pick(SHELTER_CLASSES),
      arcs: [{ fromDeg: from, toDeg: (from + 60 + random() * 90) % 360, window: null }],
      suitability: { morning: 'usable', evening: 'prime' },
      restDays: 3,
      drainBearingDeg: random() < 0.3 ? Math.floor(random() * 360) : null,
      slopePercent: null,
    };
  });
  const approaches = stands.map((s): ScoredApproach => {
    const points = [near(s.at, 350), s.at];
    return {
      id: `a-${s.id}`,
      name: `A ${s.name}`,
      standId: s.id,
      parkingName: null,
      direction: 'both',
      points,
      vehicleToIndex: 0,
    };
  });
  const first = sitWindow('2023-11-10', 'morning', DEFAULT_CLUB_RULES, PLACE);
  const issued = Math.floor(first.startAt / HOUR) * HOUR - 10 * HOUR;
  return {
    place: PLACE,
    stands,
    features,
    approaches,
    events: Array.from({ length: 60 }, (_, i) => ({
      at: issued - i * 5 * HOUR,
      kind: pick(['sit', 'bump', 'camera_check', 'work', 'walk_through'] as const),
      place: somewhere(),
      standId: null,
      bumped: 0,
    })),
    sightings: stands.map((s) => ({ standId: s.id, sits: 6, hours: 20, deer: Math.floor(random() * 25) })),
    settings: DEFAULT_SETTINGS,
    weapon: null,
    windows: windowsFrom(first, 14, DEFAULT_CLUB_RULES, PLACE),
    forecast: makeForecast(issued, 24 * 9, random),
    gatesFor: () => [],
    now: issued + 2 * HOUR,
  };
}
