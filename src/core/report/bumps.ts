import { normalizeDeg } from '../angles';
import type { Figure } from '../indices';
import { shareInterval } from '../intervals';

/** A logged sit: whether deer were bumped in it, and its wind. */
export interface WindedSit {
  standId: string;
  bumped: boolean;
  /** Mean direction the wind was to come from; null: none, or not kept. */
  windFromDeg: number | null;
  /** Whether that lies in a good arc of the stand; null: no direction. */
  inArc: boolean | null;
}

export interface BumpCount {
  sits: number;
  bumped: number;
  /** Share of sits with a bump, 0-1, with its 95 % score interval (core/intervals.ts). */
  share: Figure;
}

export const WINDS = ['N', 'NE', 'E', 'SE', 'S', 'SW', 'W', 'NW'] as const;
export type Wind = (typeof WINDS)[number];

/** The nearest of eight points; a bound belongs to the point after it: 22.5 is NE. */
export function windOf(deg: number): Wind {
  return WINDS[Math.floor((normalizeDeg(deg) + 22.5) / 45) % WINDS.length] ?? 'N';
}

export function countBumps(sits: readonly Pick<WindedSit, 'bumped'>[]): BumpCount {
  const bumped = sits.filter((sit) => sit.bumped).length;
  const share: Figure =
    sits.length === 0
      ? { known: false, why: 'no_sits' }
      : { known: true, value: bumped / sits.length, ...shareInterval(bumped, sits.length) };
  return { sits: sits.length, bumped, share };
}

/** Counts for each wind that blew in a sit, from north clockwise. */
export function bumpsByWind(sits: readonly WindedSit[]): { wind: Wind; count: BumpCount }[] {
  return WINDS.flatMap((wind) => {
    const own = sits.filter(({ windFromDeg }) => windFromDeg !== null && windOf(windFromDeg) === wind);
    return own.length === 0 ? [] : [{ wind, count: countBumps(own) }];
  });
}
