import { anyArcContains, arcsFor } from '../arcs';
import { type SitWindow, type WeatherHour, WINDOW_NAMES, type WindowName } from '../condition-types';
import { monthOf } from '../day-time';
import type { Arc, ScoredStand } from '../ground-types';
import { sectorOf } from '../sectors';

export type CoveringStand = Pick<ScoredStand, 'id' | 'name' | 'arcs' | 'suitability'>;

export interface CoverageInput {
  stands: CoveringStand[];
  /** Observed hours, in any order. 10 m wind: no slope drift is added. */
  hours: WeatherHour[];
  windows: SitWindow[];
}

/** One hour with a direction in a window, and whether some stand has it in a good arc. */
export interface CountedWind {
  window: WindowName;
  /** 1-12. */
  month: number;
  fromDeg: number;
  covered: boolean;
}

/** Hours of wind by compass point (16 from N clockwise) in one window of one month. */
export interface CoverageCell {
  window: WindowName;
  /** 1-12; null: the whole season. */
  month: number | null;
  /** All hours with a speed, those without a direction (calm, variable) among them. */
  hours: number;
  noDirection: number;
  /** Hours from each point, and those some stand has in a good arc. */
  blew: number[];
  covered: number[];
}

export interface StandCoverage {
  standId: string;
  name: string;
  hours: Record<WindowName, number>;
  /** Hours that no other stand covers. */
  alone: number;
}

export interface Coverage {
  cells: CoverageCell[];
  stands: StandCoverage[];
  winds: CountedWind[];
}

const emptyCell = (window: WindowName, month: number | null): CoverageCell => {
  const zeros = () => Array.from({ length: 16 }, () => 0);
  return { window, month, hours: 0, noDirection: 0, blew: zeros(), covered: zeros() };
};

function add(list: number[], index: number): void {
  list[index] = (list[index] ?? 0) + 1;
}

/** Good arcs of a stand in a window; none where it is to be avoided. */
export function huntedArcs(stand: Pick<CoveringStand, 'arcs' | 'suitability'>, window: WindowName): Arc[] {
  return stand.suitability[window] === 'avoid' ? [] : arcsFor(stand.arcs, window);
}

/**
 * Which winds of a season a club's stands cover, counted hour by hour: an hour counts in a window that holds its instant (the
 * start in, the end out) and is covered by a stand with its direction in a good arc of that window. Calm and variable hours
 * are counted apart and covered by none. Cells by window and month, in order, then the whole season by window. Never throws.
 */
export function coverWinds({ stands, hours, windows }: CoverageInput): Coverage {
  const rows = stands.map(
    (stand): StandCoverage => ({
      standId: stand.id,
      name: stand.name,
      hours: { morning: 0, evening: 0 },
      alone: 0,
    }),
  );
  const arcs = Object.fromEntries(
    WINDOW_NAMES.map((window) => [window, stands.map((stand) => huntedArcs(stand, window))]),
  ) as Record<WindowName, Arc[][]>;
  const cells = new Map<string, CoverageCell>();
  const cellOf = (window: WindowName, month: number | null) => {
    const key = `${month === null ? 1 : 0}|${month}|${window}`;
    const cell = cells.get(key) ?? emptyCell(window, month);
    cells.set(key, cell);
    return cell;
  };
  const known = hours
    .filter((hour) => Number.isFinite(hour.at) && hour.windSpeedMps !== null)
    .sort((a, b) => a.at - b.at);
  const winds: CountedWind[] = [];
  let first = 0;
  for (const window of [...windows].sort((a, b) => a.startAt - b.startAt)) {
    while (first < known.length && (known[first] as WeatherHour).at < window.startAt) first++;
    const counted = [cellOf(window.window, monthOf(window.day)), cellOf(window.window, null)];
    for (let i = first; i < known.length && (known[i] as WeatherHour).at < window.endAt; i++) {
      const { windFromDeg, windSpeedMps } = known[i] as WeatherHour;
      for (const cell of counted) cell.hours++;
      if (windFromDeg === null || windSpeedMps === 0) {
        for (const cell of counted) cell.noDirection++;
        continue;
      }
      const by = rows.filter((_, s) => anyArcContains(arcs[window.window][s] ?? [], windFromDeg));
      for (const row of by) row.hours[window.window]++;
      if (by.length === 1 && by[0]) by[0].alone++;
      const month = monthOf(window.day);
      winds.push({ window: window.window, month, fromDeg: windFromDeg, covered: by.length > 0 });
      const point = sectorOf(windFromDeg);
      for (const cell of counted) {
        add(cell.blew, point);
        if (by.length > 0) add(cell.covered, point);
      }
    }
  }
  const order = (cell: CoverageCell) => (cell.month === null ? 99 : (cell.month + 5) % 12);
  const list = [...cells.values()].sort(
    (a, b) => order(a) - order(b) || WINDOW_NAMES.indexOf(a.window) - WINDOW_NAMES.indexOf(b.window),
  );
  return { cells: list, stands: rows, winds };
}

const sum = (list: number[]) => list.reduce((a, b) => a + b, 0);

/** Share (0-1) of a cell's hours with a direction that is covered; null: there are none. */
export function coveredShare(cell: CoverageCell): number | null {
  const directed = sum(cell.blew);
  return directed > 0 ? sum(cell.covered) / directed : null;
}

/** Shares of the wind by compass point that sum to 1; every point alike where no wind is known. */
export function windShares(cell: CoverageCell | undefined): number[] {
  const directed = cell ? sum(cell.blew) : 0;
  return Array.from({ length: 16 }, (_, i) => (cell && directed > 0 ? (cell.blew[i] ?? 0) / directed : 1 / 16));
}
