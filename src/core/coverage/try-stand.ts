import { anyArcContains } from '../arcs';
import { WINDOW_NAMES, type WindowName } from '../condition-types';
import { sectorOf } from '../sectors';
import { type CountedWind, type CoveringStand, huntedArcs } from './cover-winds';

/** What a stand that is not there yet would add in one window. Shares 0-1 of the hours with a direction. */
export interface TrialGain {
  window: WindowName;
  /** Hours the trial would have in a good arc, and of those the hours nobody else has. */
  hours: number;
  alone: number;
  /** What stands cover already, and what the trial would add to it. */
  covered: number;
  added: number;
  /** Compass points 0-15 of which the trial has some hour. */
  winds: ReadonlySet<number>;
  /** By compass point, 16 from N clockwise. */
  points: { share: number; covered: number; added: number }[];
  /** Only months with such hours, in order of the season from July. */
  months: { month: number; added: number }[];
}

const seasonOrder = (month: number) => (month + 5) % 12;

/** The gain of a trial over the winds of a season, window by window; a window without hours is left out. Never throws. */
export function tryStand(
  winds: readonly CountedWind[],
  trial: Pick<CoveringStand, 'arcs' | 'suitability'>,
): TrialGain[] {
  return WINDOW_NAMES.flatMap((window) => {
    const own = winds.filter((wind) => wind.window === window);
    if (own.length === 0) return [];
    const arcs = huntedArcs(trial, window);
    const isIn = own.map((wind) => anyArcContains(arcs, wind.fromDeg));
    const points = Array.from({ length: 16 }, () => ({ share: 0, covered: 0, added: 0 }));
    const months = new Map<number, { all: number; added: number }>();
    let alone = 0;
    own.forEach((wind, i) => {
      const isGain = isIn[i] === true && !wind.covered;
      const month = months.get(wind.month) ?? { all: 0, added: 0 };
      months.set(wind.month, { all: month.all + 1, added: month.added + (isGain ? 1 : 0) });
      if (isGain) alone++;
      const point = points[sectorOf(wind.fromDeg)];
      if (!point) return;
      point.share += 1 / own.length;
      if (wind.covered) point.covered += 1 / own.length;
      if (isGain) point.added += 1 / own.length;
    });
    return [
      {
        window,
        winds: new Set(own.filter((_, i) => isIn[i]).map(({ fromDeg }) => sectorOf(fromDeg))),
        hours: isIn.filter(Boolean).length,
        alone,
        covered: own.filter(({ covered }) => covered).length / own.length,
        added: alone / own.length,
        points,
        months: [...months]
          .map(([month, { all, added }]) => ({ month, added: added / all }))
          .sort((a, b) => seasonOrder(a.month) - seasonOrder(b.month)),
      },
    ];
  });
}
