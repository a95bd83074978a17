import { placeAir } from './air/place-air';
import { standAir } from './air/stand-air';
import { anyArcContains, arcsFor, coveredDeg } from './arcs';
import type { SitWindow, WeatherHour, WindowName } from './condition-types';
import type { ScoredStand } from './ground-types';
import { SECTOR_NAMES, type SectorName, sectorOf } from './sectors';
import type { ScoringSettings } from './settings';
import type { Place } from './sun';

export interface HindcastInput {
  place: Place;
  stands: ScoredStand[];
  /** Observed hours of a season, in any order. */
  hours: WeatherHour[];
  windows: SitWindow[];
  settings: ScoringSettings;
  /** Share of a window that the wind must have been in a good arc; 0.8 when not given. */
  neededShare?: number;
}

export interface StandHindcast {
  standId: string;
  standName: string;
  /** Windows with enough observed wind to judge, and those of them it could have been sat on; by window and in all. */
  judged: Record<WindowName, number>;
  sittable: Record<WindowName, number>;
  share: number | null;
  /** Share of the compass its arcs take, 0-1; null: none are set. */
  coveredShare: number | null;
}

export interface SectorHindcast {
  sector: SectorName;
  /** Share of all observed half hours with a direction, 0-1. */
  share: number;
  /** Stands with this wind in a good arc in some window they are not to be avoided in. */
  stands: number;
}

export interface Hindcast {
  stands: StandHindcast[];
  sectors: SectorHindcast[];
  /** Winds that blew and that no stand covers, the commonest first. */
  uncovered: SectorHindcast[];
  windows: number;
  judged: number;
  /** Judged windows on which no stand at all could have been sat. */
  noStand: { day: string; window: WindowName }[];
  /** Share of observed half hours that were calm or variable. */
  noDirectionShare: number;
}

function coversSector(stand: ScoredStand, index: number): boolean {
  return (['morning', 'evening'] as const).some(
    (w) => stand.suitability[w] !== 'avoid' && anyArcContains(arcsFor(stand.arcs, w), index * 22.5),
  );
}

/**
 * A season of observed wind over a club's stands: on what share of windows each could have been sat, and which winds no stand
 * covers. A window counts for a stand that is not to be avoided then when the wind at its seat, slope drift added, was in a
 * good arc for the needed share; calm and variable half hours are in no arc but 'any'. Windows with over a third missing are not judged.
 */
export function hindcast(input: HindcastInput): Hindcast {
  const { place, stands, settings, windows } = input;
  const needed = input.neededShare ?? 0.8;
  const forecast = { issuedAt: 0, fetchedAt: 0, source: 'observed', members: [], hours: input.hours };
  const counts = stands.map(() => ({ judged: { morning: 0, evening: 0 }, sittable: { morning: 0, evening: 0 } }));
  const blew = SECTOR_NAMES.map(() => 0);
  const noStand: Hindcast['noStand'] = [];
  let [judged, directed, still] = [0, 0, 0];
  const sorted = [...input.hours].filter((h) => Number.isFinite(h.at)).sort((a, b) => a.at - b.at);
  for (const window of windows) {
    const near = sliceHours(sorted, window.startAt - 3 * HOUR, window.endAt + 3 * HOUR);
    const span = { ...place, startAt: window.startAt, endAt: window.endAt, forecast: { ...forecast, hours: near } };
    const steps = placeAir(span, settings.air);
    const seen = steps.filter((s) => s.kind !== 'missing');
    for (const step of seen) {
      if (step.fromDeg === null) still++;
      else {
        directed++;
        const index = sectorOf(step.fromDeg);
        blew[index] = (blew[index] ?? 0) + 1;
      }
    }
    if (steps.length === 0 || seen.length < (2 / 3) * steps.length) continue;
    judged++;
    let some = false;
    stands.forEach((stand, i) => {
      const count = counts[i];
      if (!count) return;
      count.judged[window.window]++;
      if (stand.suitability[window.window] === 'avoid') return;
      const arcs = arcsFor(stand.arcs, window.window);
      const air = standAir(stand, seen, settings.air);
      const any = coveredDeg(arcs) >= 360;
      const inArc = air.filter((a) => (a.seatFromDeg === null ? any : anyArcContains(arcs, a.seatFromDeg))).length;
      if (inArc < needed * seen.length - 1e-9) return;
      count.sittable[window.window]++;
      some = true;
    });
    if (!some) noStand.push({ day: window.day, window: window.window });
  }
  const sectors = SECTOR_NAMES.map((sector, i) => ({
    sector,
    share: directed > 0 ? (blew[i] ?? 0) / directed : 0,
    stands: stands.filter((s) => coversSector(s, i)).length,
  }));
  return {
    stands: stands.map((stand, i) => standRow(stand, counts[i])),
    sectors,
    uncovered: sectors.filter((s) => s.stands === 0 && s.share > 0).sort((a, b) => b.share - a.share),
    windows: windows.length,
    judged,
    noStand,
    noDirectionShare: directed + still > 0 ? still / (directed + still) : 0,
  };
}

const HOUR = 3_600_000;

function sliceHours(sorted: WeatherHour[], from: number, until: number): WeatherHour[] {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const mid = (low + high) >> 1;
    if ((sorted[mid]?.at ?? 0) < from) low = mid + 1;
    else high = mid;
  }
  const near: WeatherHour[] = [];
  for (let i = low; i < sorted.length && (sorted[i]?.at ?? 0) <= until; i++) near.push(sorted[i] as WeatherHour);
  return near;
}

type Counts = Pick<StandHindcast, 'judged' | 'sittable'>;

function standRow(stand: ScoredStand, count: Counts | undefined): StandHindcast {
  const judged = count?.judged ?? { morning: 0, evening: 0 };
  const sittable = count?.sittable ?? { morning: 0, evening: 0 };
  const total = judged.morning + judged.evening;
  return {
    standId: stand.id,
    standName: stand.name,
    judged,
    sittable,
    share: total > 0 ? (sittable.morning + sittable.evening) / total : null,
    coveredShare: stand.arcs.length > 0 ? coveredDeg(stand.arcs) / 360 : null,
  };
}
