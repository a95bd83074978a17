import type { Geometry } from 'geojson';
import { formatArc, mergeArcs } from '@/core/arcs';
import { formatDay } from '@/core/day-time';
import { distanceM, type LatLon, lengthM, toLocal } from '@/core/geometry';
import type { Arc, Suitability } from '@/core/ground-types';
import { formatArea, formatDistance, type Units } from '@/core/units';
import type { ClosureRow } from './closures-data';
import { CLOSED_DAYS_WORDS } from './words/closures';
import { NONE_SET } from './words/kinds';

/** A stand as a row of the list. */
export interface StandLine {
  id: string;
  name: string;
  kind: string;
  morningArcs: Arc[];
  eveningArcs: Arc[];
  morningWinds: string;
  eveningWinds: string;
  morning: Suitability;
  evening: Suitability;
  restDays: number;
  weapons: string;
  approaches: number;
  /** Empty when it is open and no closure is to come. */
  closed: string;
  closedNow: boolean;
}

export interface FeatureLine {
  id: string;
  name: string;
  kind: string;
  shape: string;
  size: string;
  months: string;
}

export interface ParkingLine {
  id: string;
  name: string;
  place: string;
  approaches: number;
  notes: string;
}

export interface ClosureLine {
  id: string;
  /** null: the whole ground. */
  standName: string | null;
  fromDay: string;
  days: string;
  reason: string;
  now: boolean;
  /** Sits booked all the same; empty when there are none. */
  touched: string;
}

/** Arcs for people, as compass points and degrees, each once: 'NW-N · 304°–11°'. */
export function formatArcs(arcs: readonly Arc[]): string {
  return arcs.length === 0 ? NONE_SET : mergeArcs(arcs).map(formatArc).join(', ');
}

/** The same as compass points alone, for a narrow column. */
export function formatWinds(arcs: readonly Arc[]): string {
  return mergeArcs(arcs)
    .map((arc) => formatArc(arc).split(' · ')[0])
    .join(', ');
}

export function formatDays(closure: Pick<ClosureRow, 'fromDay' | 'toDay'>): string {
  const from = formatDay(closure.fromDay, true);
  if (closure.toDay === null) return CLOSED_DAYS_WORDS.untilOpened(from);
  return closure.toDay === closure.fromDay ? from : CLOSED_DAYS_WORDS.days(from, formatDay(closure.toDay, true));
}

/** Whether a closure covers a day. */
export const holdsOn = ({ fromDay, toDay }: Pick<ClosureRow, 'fromDay' | 'toDay'>, day: string): boolean =>
  fromDay <= day && (toDay === null || toDay >= day);

/** What a list says of a stand's closures on a day, the first that holds or is to come. */
export function formatClosed(closures: Pick<ClosureRow, 'fromDay' | 'toDay' | 'reason'>[], today: string): string {
  const [next] = closures
    .filter((c) => c.toDay === null || c.toDay >= today)
    .toSorted((a, b) => a.fromDay.localeCompare(b.fromDay));
  if (!next) return '';
  if (next.fromDay > today) return CLOSED_DAYS_WORDS.closes(formatDay(next.fromDay), next.reason);
  return next.toDay === null
    ? CLOSED_DAYS_WORDS.closedUntilOpened(next.reason)
    : CLOSED_DAYS_WORDS.closedUntil(formatDay(next.toDay), next.reason);
}

/** Length of a line or area of a patch; empty for a point. */
export function formatSize(geometry: Geometry, centre: LatLon, units: Units): string {
  const local = (p: number[]) => toLocal(centre, { lon: p[0] ?? 0, lat: p[1] ?? 0 });
  if (geometry.type === 'LineString') return formatDistance(lengthM(geometry.coordinates.map(local)), units);
  if (geometry.type !== 'Polygon') return '';
  const areas = geometry.coordinates.map((ring) => {
    const points = ring.map(local);
    const twice = points.reduce((sum, p, i) => {
      const next = points[(i + 1) % points.length] ?? p;
      return sum + p.eastM * next.northM - next.eastM * p.northM;
    }, 0);
    return Math.abs(twice) / 2;
  });
  const [outer = 0, ...holes] = areas;
  return formatArea(outer - holes.reduce((sum, hole) => sum + hole, 0), units);
}

/** How far two places lie apart, for people. */
export function formatApart(centre: LatLon, a: LatLon, b: LatLon, units: Units): string {
  return formatDistance(distanceM(toLocal(centre, a), toLocal(centre, b)), units);
}
