import type { Position } from 'geojson';
import { dayOf, monthOf } from '@/core/day-time';
import { fromLocal } from '@/core/geometry';
import { type Point, TIMES_OF_DAY, type TimeOfDay } from '@/core/ground-types';
import { cropYearOf } from '@/core/map-layers';
import { chainMovement, type MovementLine, type Stop } from '@/core/movement/chain-movement';
import { SECTOR_NAMES } from '@/core/sectors';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { completeSetup } from '@/core/setup-check/setup-settings';
import { formatDistance } from '@/core/units';
import { loadGround } from '@/features/ground/data';
import { featuresInYear } from '@/features/ground/features-in-year';
import { groundToCore } from '@/features/ground/to-core';
import { getSetupSettings } from '@/features/setup/settings-data';
import type { ClubScope } from '@/server/scope';
import { TIME_WORDS, MOVEMENT_WORDS as W, WHEN_WORDS } from './words';

export interface LegView {
  /** Runs through all lines: the same number stands on the map. */
  number: number;
  key: string;
  from: string;
  to: string;
  length: string;
  path: Position[];
  stands: { id: string; name: string; when: string; at: Position; aim: Position }[];
}

export interface LineView {
  id: string;
  name: string;
  length: string;
  /** Deer's way, for people; null: not known. */
  way: string | null;
  /** 1: along the line as it is drawn, in the morning; -1: against it; null: not known. Evenings are the other way. */
  morning: 1 | -1 | null;
  /** Which way deer go at what time of day, and how often they are on it. */
  times: string[];
  legs: LegView[];
  gaps: { text: string; path: Position[] }[];
}

/** Points that lie side by side as spans: 'NW-NE', 'S'. */
export function windSpans(points: number[]): string {
  if (points.length === 16) return WHEN_WORDS.anyWind;
  const held = new Set(points);
  const starts = points.filter((p) => !held.has((p + 15) % 16));
  return starts
    .map((start) => {
      let end = start;
      while (held.has((end + 1) % 16)) end = (end + 1) % 16;
      return start === end ? SECTOR_NAMES[start] : `${SECTOR_NAMES[start]}-${SECTOR_NAMES[end]}`;
    })
    .join(', ');
}

function whenText(windows: MovementLine['legs'][number]['stands'][number]['windows']): string {
  const texts = windows.map(({ window, winds }) => ({ window, winds: windSpans(winds) }));
  const [first, second] = texts;
  if (first && second && first.winds === second.winds) return WHEN_WORDS.both(first.winds);
  return texts.map(({ window, winds }) => WHEN_WORDS.one(window, winds)).join('; ');
}

/** Where deer come from and go to in the morning; null: not known. */
function endsOf({ way, stops }: MovementLine): { from: Stop; to: Stop } | null {
  const [first, last] = [stops[0], stops.at(-1)];
  if (way.morning === null || !first || !last) return null;
  return way.morning === 1 ? { from: first, to: last } : { from: last, to: first };
}

/** At first light and in the morning to the beds, in the afternoon and at last light to the food; between, either way. */
const TIMES_TO: TimeOfDay[] = ['dawn', 'morning'];
const TIMES_FROM: TimeOfDay[] = ['afternoon', 'dusk'];

/** Deer's way by time of day with how often they are on the line. */
function timesOf(line: MovementLine): string[] {
  const at = (times: readonly TimeOfDay[]) =>
    times.map((time) =>
      TIME_WORDS.at(TIME_WORDS.names[time], Math.round((line.uses[TIMES_OF_DAY.indexOf(time)] ?? 0) * 100)),
    );
  const ends = endsOf(line);
  if (!ends) return [TIME_WORDS.either(at(TIMES_OF_DAY))];
  const rest = TIMES_OF_DAY.filter((time) => !TIMES_TO.includes(time) && !TIMES_FROM.includes(time));
  return [
    TIME_WORDS.toward(ends.to.name, at(TIMES_TO)),
    TIME_WORDS.toward(ends.from.name, at(TIMES_FROM)),
    TIME_WORDS.either(at(rest)),
  ];
}

function lineView(line: MovementLine, { club }: ClubScope, firstLeg: number): LineView {
  const position = (p: Point): Position => {
    const { lat, lon } = fromLocal(club, p);
    return [lon, lat];
  };
  const ends = endsOf(line);
  return {
    id: line.id,
    name: line.name,
    length: formatDistance(line.lengthM, club.units),
    way: ends && W.way(ends.from.name, ends.to.name),
    morning: line.way.morning,
    times: timesOf(line),
    legs: line.legs.map((leg, i) => ({
      number: firstLeg + i,
      key: `${leg.from.name}|${leg.to.name}|${leg.from.alongM}`,
      from: leg.from.name,
      to: leg.to.name,
      length: formatDistance(leg.lengthM, club.units),
      path: leg.points.map(position),
      stands: leg.stands.map(({ standId, name, windows, at, aim }) => ({
        id: standId,
        name,
        when: whenText(windows),
        at: position(at),
        aim: position(aim),
      })),
    })),
    gaps: line.gaps.map((gap) => ({
      text: W.gap(formatDistance(gap.toM - gap.fromM, club.units), gap.between),
      path: gap.points.map(position),
    })),
  };
}

/** The lines deer travel this month, with what lies on them and who can sit on each leg. */
export async function readMovement(scope: ClubScope, now: number): Promise<{ lines: LineView[]; month: number }> {
  const { club } = scope;
  const today = dayOf(now, club.zone);
  const [rows, { own }] = await Promise.all([loadGround(scope), getSetupSettings(scope)]);
  const core = groundToCore(club, { ...rows, features: featuresInYear(rows.features, cropYearOf(today)) });
  const month = monthOf(today);
  const features = core.features.filter((f) => f.months.includes(month));
  const lines = chainMovement({
    features,
    stands: core.stands,
    scoring: DEFAULT_SETTINGS,
    setup: completeSetup(own),
    month,
  });
  let number = 1;
  const views = lines.map((line) => {
    const view = lineView(line, scope, number);
    number += line.legs.length;
    return view;
  });
  return { lines: views, month };
}
