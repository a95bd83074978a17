import { countInterval, type Interval, ratioInterval, shareInterval } from './intervals';
import { INTERVAL_WORDS, NO_FIGURE_WORDS } from './words/figures';

/**
 * Observation indices: what members count from their stands, over the hours they sat. An index, not a census. Sits in which
 * nothing was seen count with their hours. Rates are sums over sums; the mean of the sits' own rates would be wrong.
 * Intervals take each deer as seen on its own; deer come in groups, so the truth is less sure than they say.
 */

export const DEER_CLASSES = ['bucks', 'does', 'fawns', 'unknown'] as const;
export type DeerClass = (typeof DEER_CLASSES)[number];

/** One logged sit: hours sat (0 or more), deer of each class (bucks: antlered), deer bumped. */
export interface SitCount extends Record<DeerClass, number> {
  hours: number;
  bumped: number;
}

export type NoFigure = 'no_hours' | 'no_sits' | 'no_deer' | 'no_bucks' | 'no_does';

/** A figure with its 95 % interval, or why there is none. */
export type Figure = ({ known: true; value: number } & Interval) | { known: false; why: NoFigure };

export interface Indices {
  sits: number;
  /** Sits in which no deer was seen. */
  zeroSits: number;
  hours: number;
  seen: Record<DeerClass | 'all', number>;
  /** Deer an hour. */
  perHour: Record<DeerClass | 'all', Figure>;
  /** Fawns are left out of it. */
  doesPerBuck: Figure;
  fawnsPerDoe: Figure;
  /** Share of all deer seen that were not made out, 0-1. */
  unknownShare: Figure;
  /** Sits in which a deer was bumped, on the way in, from the seat or on the way out. */
  bumpedSits: number;
  /** Their share of all sits, 0-1. */
  bumpedShare: Figure;
}

const none = (why: NoFigure): Figure => ({ known: false, why });

function rate(count: number, hours: number): Figure {
  if (hours <= 0) return none('no_hours');
  const { low, high } = countInterval(count);
  return { known: true, value: count / hours, low: low / hours, high: high / hours };
}

function ratio(a: number, b: number, why: NoFigure): Figure {
  return b === 0 ? none(why) : { known: true, value: a / b, ...ratioInterval(a, b) };
}

function share(some: number, all: number, why: NoFigure): Figure {
  return all === 0 ? none(why) : { known: true, value: some / all, ...shareInterval(some, all) };
}

const deerOf = (sit: SitCount) => DEER_CLASSES.reduce((sum, name) => sum + sit[name], 0);

/** The indices of any number of logged sits; none gives zeros and no rates. Counts are whole numbers, 0 or more. */
export function indicesOf(sits: readonly SitCount[]): Indices {
  const total = (pick: (sit: SitCount) => number) => sits.reduce((sum, sit) => sum + pick(sit), 0);
  const hours = total((sit) => Math.max(0, sit.hours));
  const seen = {
    all: total(deerOf),
    bucks: total((sit) => sit.bucks),
    does: total((sit) => sit.does),
    fawns: total((sit) => sit.fawns),
    unknown: total((sit) => sit.unknown),
  };
  const bumpedSits = sits.filter((sit) => sit.bumped > 0).length;
  return {
    sits: sits.length,
    zeroSits: sits.filter((sit) => deerOf(sit) === 0).length,
    hours,
    seen,
    perHour: {
      all: rate(seen.all, hours),
      bucks: rate(seen.bucks, hours),
      does: rate(seen.does, hours),
      fawns: rate(seen.fawns, hours),
      unknown: rate(seen.unknown, hours),
    },
    doesPerBuck: ratio(seen.does, seen.bucks, 'no_bucks'),
    fawnsPerDoe: ratio(seen.fawns, seen.does, 'no_does'),
    unknownShare: share(seen.unknown, seen.all, 'no_deer'),
    bumpedSits,
    bumpedShare: share(bumpedSits, sits.length, 'no_sits'),
  };
}

/** The indices of each group of sits, in the order in which the groups first come. */
export function indicesBy<T extends SitCount, K>(sits: readonly T[], keyOf: (sit: T) => K): Map<K, Indices> {
  const groups = new Map<K, T[]>();
  for (const sit of sits) {
    const key = keyOf(sit);
    const group = groups.get(key);
    if (group) group.push(sit);
    else groups.set(key, [sit]);
  }
  return new Map([...groups].map(([key, group]) => [key, indicesOf(group)]));
}

/** A figure for people: '1.70', '11.8 %' for shares, or why there is none: 'no bucks seen'. */
export function figureText(figure: Figure, as: 'number' | 'percent' = 'number'): string {
  if (!figure.known) return NO_FIGURE_WORDS[figure.why];
  return as === 'percent' ? `${(figure.value * 100).toFixed(1)} %` : figure.value.toFixed(2);
}

/** Its 95 % interval for people: '1.18 to 2.38'; empty where there is no figure. */
export function intervalText(figure: Figure, as: 'number' | 'percent' = 'number'): string {
  if (!figure.known) return '';
  const text = (value: number) => (as === 'percent' ? String(Math.round(value * 100)) : value.toFixed(2));
  return INTERVAL_WORDS[as](text(figure.low), text(figure.high));
}
