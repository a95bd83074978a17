import { DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import type { Forecast, SitWindow, WeatherHour, WindowName } from '@/core/condition-types';
import type { LocalShape, Point, ScoredApproach, ScoredFeature, ScoredStand } from '@/core/ground-types';
import type { RankInput } from '@/core/rank-input';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { sitWindow } from '@/core/windows';

const HOUR = 3_600_000;

/** A made-up place in hill country; nothing of it is anybody's. */
export const PLACE = { lat: 38.2, lon: -81.9, zone: 'America/New_York' };
export const DAY = '2023-12-09';

export const at = (eastM: number, northM: number): Point => ({ eastM, northM });

export function box(eastM: number, northM: number, width: number, height: number): LocalShape {
  return {
    type: 'area',
    rings: [
      [at(eastM, northM), at(eastM + width, northM), at(eastM + width, northM + height), at(eastM, northM + height)],
    ],
  };
}

export function makeStand(over: Partial<ScoredStand> & { id: string }): ScoredStand {
  return {
    name: over.id,
    kind: 'ladder',
    at: at(0, 0),
    seatHeightM: 5,
    facingDeg: null,
    shotSide: 'either',
    shotRangeM: { bow: 27, rifle: 150 },
    shelter: 'edge',
    arcs: [],
    suitability: { morning: 'usable', evening: 'usable' },
    restDays: 3,
    drainBearingDeg: null,
    slopePercent: null,
    ...over,
  };
}

export function makeFeature(id: string, kind: ScoredFeature['kind'], shape: LocalShape): ScoredFeature {
  return { id, name: id, kind, shape, months: [9, 10, 11, 12, 1], use: null };
}

export function makeApproach(standId: string, points: Point[], over: Partial<ScoredApproach> = {}): ScoredApproach {
  const id = over.id ?? `${standId}-way`;
  return { id, name: id, standId, parkingName: 'Gate', direction: 'both', points, vehicleToIndex: 0, ...over };
}

export function windowOf(window: WindowName, day = DAY): SitWindow {
  return sitWindow(day, window, DEFAULT_CLUB_RULES, PLACE);
}

export type WeatherOver = Partial<WeatherHour> | ((at: number) => Partial<WeatherHour>);

/** A steady forecast about a window; `over` changes any hour. */
export function makeForecast(window: SitWindow, fromDeg: number, speedMps: number, over: WeatherOver = {}): Forecast {
  const first = Math.floor(window.startAt / HOUR) * HOUR - 6 * HOUR;
  const hours = Array.from({ length: 24 }, (_, i): WeatherHour => {
    const hourAt = first + i * HOUR;
    return {
      at: hourAt,
      windFromDeg: fromDeg,
      windSpeedMps: speedMps,
      gustMps: speedMps * 1.5,
      tempC: 4,
      pressureHpa: 1018,
      precipMm: 0,
      cloudPercent: 100,
      radiationWm2: null,
      thunder: false,
      ...(typeof over === 'function' ? over(hourAt) : over),
    };
  });
  return { issuedAt: first, fetchedAt: first, source: 'made up', hours, members: [] };
}

export function makeInput(over: Partial<RankInput> & Pick<RankInput, 'stands'>): RankInput {
  const window = over.window ?? windowOf('morning');
  return {
    place: PLACE,
    features: [],
    approaches: [],
    events: [],
    sightings: [],
    forecast: makeForecast(window, 270, 4),
    window,
    settings: DEFAULT_SETTINGS,
    gatesByStand: new Map(),
    weapon: null,
    now: window.startAt - 10 * HOUR,
    ...over,
  };
}
