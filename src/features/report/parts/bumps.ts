import { anyArcContains, arcsFor } from '@/core/arcs';
import { type BumpCount, bumpsByWind, countBumps, type Wind, type WindedSit } from '@/core/report/bumps';
import { windowsHeld } from '@/features/bookings/words/sits';
import type { ReportRows } from '../load-rows';

export interface BumpRow {
  standId: string;
  name: string;
  count: BumpCount;
  winds: { wind: Wind; count: BumpCount }[];
}

export interface BumpsPart {
  all: BumpCount;
  /** Stands with a logged sit, the largest share of bumps first. */
  rows: BumpRow[];
  winds: { wind: Wind; count: BumpCount }[];
  inArc: BumpCount;
  outOfArc: BumpCount;
  /** Logged sits without a direction on record. */
  noWind: number;
}

const shareOf = ({ count }: BumpRow) => (count.share.known ? count.share.value : 0);

/** Deer bumped, of the sits whose log the reader may see. */
export function readBumps(rows: ReportRows): BumpsPart {
  const stands = new Map(rows.stands.map((stand) => [stand.id, stand]));
  const sits = rows.sits.flatMap(({ standId, windows, windFromDeg, log }): WindedSit[] => {
    if (!log) return [];
    const arcs = windowsHeld(windows).flatMap((window) => arcsFor(stands.get(standId)?.arcs ?? [], window));
    const inArc = windFromDeg === null ? null : anyArcContains(arcs, windFromDeg);
    return [{ standId, windFromDeg, inArc, bumped: log.bumpedIn + log.bumpedSitting + log.bumpedOut > 0 }];
  });
  return {
    all: countBumps(sits),
    rows: rows.stands
      .map(({ id, name }) => {
        const own = sits.filter(({ standId }) => standId === id);
        return { standId: id, name, count: countBumps(own), winds: bumpsByWind(own) };
      })
      .filter(({ count }) => count.sits > 0)
      .sort((a, b) => shareOf(b) - shareOf(a) || b.count.sits - a.count.sits || a.name.localeCompare(b.name)),
    winds: bumpsByWind(sits),
    inArc: countBumps(sits.filter(({ inArc }) => inArc === true)),
    outOfArc: countBumps(sits.filter(({ inArc }) => inArc === false)),
    noWind: sits.filter(({ windFromDeg }) => windFromDeg === null).length,
  };
}
