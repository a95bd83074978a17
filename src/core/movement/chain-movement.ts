import { MOVEMENT_WORDS } from '@/core/words/movement';
import type { WindowName } from '../condition-types';
import { bearingDeg, distanceM, distanceToShapeM, lengthM } from '../geometry';
import type { FeatureKind, Point, ScoredFeature, ScoredStand } from '../ground-types';
import { sectorName } from '../sectors';
import type { ScoringSettings } from '../settings';
import type { SetupSettings } from '../setup-check/setup-settings';
import { along, canShoot, carries, shotOf, windowsHunted, windsHunted } from '../setup-check/shot-of';
import { usesOf } from '../whereabouts';
import { stretchOf } from './stretch';

export interface MovementInput {
  features: ScoredFeature[];
  stands: ScoredStand[];
  scoring: ScoringSettings;
  setup: SetupSettings;
  /** 1-12: what is used then lies on the lines. */
  month: number;
}

export interface Stop {
  /** null: an end of the line at which nothing is drawn. */
  featureId: string | null;
  name: string;
  kind: FeatureKind | null;
  /** Metres along the line from its first point, and off it. */
  alongM: number;
  offM: number;
}

export interface Server {
  standId: string;
  name: string;
  /** The seat, and the place on the leg nearest to it that is in shot. */
  at: Point;
  aim: Point;
  windows: {
    window: WindowName /** Compass points 0-15 it is hunted on that keep its scent off the leg. */;
    winds: number[];
  }[];
}

export interface Leg {
  from: Stop;
  to: Stop;
  lengthM: number;
  points: Point[];
  stands: Server[];
}

export interface MovementLine {
  id: string;
  name: string;
  lengthM: number;
  stops: Stop[];
  legs: Leg[];
  /** Stretches no stand reaches, named by the stops they lie between. */
  gaps: { fromM: number; toM: number; between: string; points: Point[] }[];
  /** Deer's way in each window: 1 from the first point to the last, -1 back; null: the line joins no bed to no food. */
  way: Record<WindowName, 1 | -1 | null>;
  /** Chance of deer on it at each of TIMES_OF_DAY this month, 0-1. */
  uses: number[];
}

const FOOD: ReadonlySet<FeatureKind> = new Set(['food_plot', 'crop', 'mast']);
const BEDS: ReadonlySet<FeatureKind> = new Set(['bedding', 'sanctuary']);
const STEP_M = 5;
const SAME_PLACE_M = 15;

interface Station {
  p: Point;
  alongM: number;
}

function stationsOf(points: Point[]): Station[] {
  const steps = along(points, STEP_M);
  let gone = 0;
  return steps.map((p, i) => {
    if (i > 0) gone += distanceM(steps[i - 1] as Point, p);
    return { p, alongM: gone };
  });
}

function stopsOf(line: ScoredFeature, stations: Station[], input: MovementInput): Stop[] {
  const { stopWithinM } = input.setup;
  const found = input.features.flatMap((feature): Stop[] => {
    if (feature.id === line.id || feature.kind === 'travel_line' || feature.kind === 'rub_line') return [];
    const near = stations
      .map((s) => ({ s, offM: distanceToShapeM(s.p, feature.shape) }))
      .reduce<{ s: Station; offM: number } | null>((best, one) => (best && best.offM <= one.offM ? best : one), null);
    if (!near || near.offM > stopWithinM) return [];
    const { id, name, kind } = feature;
    return [{ featureId: id, name, kind, alongM: near.s.alongM, offM: near.offM }];
  });
  const stops = found.sort((a, b) => a.alongM - b.alongM || a.name.localeCompare(b.name));
  const [first, last] = [stations[0], stations.at(-1)];
  if (!first || !last) return stops;
  const end = (at: Station, from: Point): Stop => ({
    featureId: null,
    name: MOVEMENT_WORDS.end(sectorName(bearingDeg(from, at.p))),
    kind: null,
    alongM: at.alongM,
    offM: 0,
  });
  const lead = (stops[0]?.alongM ?? Number.POSITIVE_INFINITY) > stopWithinM ? [end(first, last.p)] : [];
  const left = last.alongM - (stops.at(-1)?.alongM ?? Number.NEGATIVE_INFINITY);
  return [...lead, ...stops, ...(left > stopWithinM ? [end(last, first.p)] : [])];
}

function serversOf(stretch: Station[], input: MovementInput): Server[] {
  const { setup } = input;
  return input.stands.flatMap((stand: ScoredStand) => {
    const shots = stretch.map(({ p }) =>
      shotOf(stand, { type: 'point', at: p }, { settings: setup, scoring: input.scoring }),
    );
    const shot = shots.filter(canShoot).sort((a, b) => a.metres - b.metres)[0];
    if (!shot) return [];
    const windows = windowsHunted(stand).map((window) => ({
      window,
      winds: windsHunted(stand, window).filter((w) => !carries(w * 22.5, shot.bearing, setup.scentDeg)),
    }));
    const served = windows.filter(({ winds }) => winds.length > 0);
    if (served.length === 0) return [];
    return [{ standId: stand.id, name: stand.name, at: stand.at, aim: shot.nearest, windows: served }];
  });
}

function gapsOf(line: Point[], stations: Station[], stops: Stop[], input: MovementInput): MovementLine['gaps'] {
  const { gapFromM } = input.setup;
  const open = stations.map((s) => serversOf([s], input).length === 0);
  const gaps: MovementLine['gaps'] = [];
  for (let i = 0; i < stations.length; i++) {
    if (!open[i]) continue;
    let k = i;
    while (open[k + 1]) k++;
    const [fromM, toM] = [stations[i]?.alongM ?? 0, stations[k]?.alongM ?? 0];
    i = k;
    if (toM - fromM < gapFromM) continue;
    const before = stops.filter((s) => s.alongM <= fromM + STEP_M).at(-1) ?? stops[0];
    const after = stops.find((s) => s.alongM >= toM - STEP_M) ?? stops.at(-1);
    gaps.push({
      fromM,
      toM,
      between: MOVEMENT_WORDS.between(before?.name ?? '', after?.name ?? ''),
      points: stretchOf(line, fromM, toM),
    });
  }
  return gaps;
}

/** Stops at one place of a line count as one: a ford lies in its creek. */
function joinStops(stops: Stop[]): Stop[] {
  const joined: Stop[] = [];
  for (const stop of stops) {
    const last = joined.at(-1);
    if (last && stop.alongM - last.alongM < SAME_PLACE_M) {
      joined[joined.length - 1] = { ...last, name: MOVEMENT_WORDS.together(last.name, stop.name) };
    } else joined.push(stop);
  }
  return joined;
}

const mean = (list: number[]) => list.reduce((a, b) => a + b, 0) / list.length;

function wayOf(stops: Stop[], length: number): MovementLine['way'] {
  const at = (kinds: ReadonlySet<FeatureKind>) => stops.filter((s) => s.kind && kinds.has(s.kind)).map((s) => s.alongM);
  const [beds, food] = [at(BEDS), at(FOOD)];
  if (beds.length === 0 && food.length === 0) return { morning: null, evening: null };
  const bedsAt = beds.length > 0 ? mean(beds) : length - mean(food);
  const foodAt = food.length > 0 ? mean(food) : length - mean(beds);
  if (bedsAt === foodAt) return { morning: null, evening: null };
  const morning = bedsAt > foodAt ? 1 : -1;
  return { morning, evening: morning === 1 ? -1 : 1 };
}

/**
 * Lines deer travel as chains of the features on them: stops in order with metres along the line, the stands that reach each
 * leg by window and wind, gaps no stand reaches, and the deer's way (from food to beds in the morning, back in the evening;
 * with only one of the two on a line, toward or from that end). Practice. Lines in order of name. Never throws.
 */
export function chainMovement(input: MovementInput): MovementLine[] {
  const lines = input.features.filter((f) => f.kind === 'travel_line' && f.shape.type === 'line');
  return lines
    .flatMap((line): MovementLine[] => {
      if (line.shape.type !== 'line' || line.shape.points.length < 2) return [];
      const { points } = line.shape;
      const stations = stationsOf(points);
      const all = stopsOf(line, stations, input);
      const stops = joinStops(all);
      const legs = stops.slice(1).map((to, i): Leg => {
        const from = stops[i] as Stop;
        const stretch = stations.filter((s) => s.alongM >= from.alongM && s.alongM <= to.alongM);
        return {
          from,
          to,
          lengthM: to.alongM - from.alongM,
          points: stretchOf(points, from.alongM, to.alongM),
          stands: serversOf(stretch, input),
        };
      });
      const length = lengthM(points);
      const gaps = gapsOf(points, stations, stops, input);
      const { id, name } = line;
      const uses = usesOf(line, input.month, input.scoring.whereabouts);
      return [{ id, name, lengthM: length, stops, legs, gaps, way: wayOf(all, length), uses }];
    })
    .sort((a, b) => a.name.localeCompare(b.name));
}
