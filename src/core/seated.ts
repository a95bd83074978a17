/** Share (0-1) of a sit's weights that falls after an instant; the step the instant lies in counts by its rest. */
export function shareAfter(at: number, stepAts: number[], endAt: number, weights: ArrayLike<number>): number {
  let after = 0;
  let total = 0;
  for (let i = 0; i < stepAts.length; i++) {
    const from = stepAts[i] as number;
    const until = Math.min(stepAts[i + 1] ?? endAt, endAt);
    const weight = weights[i] as number;
    total += weight;
    if (at <= from) after += weight;
    else if (at < until) after += (weight * (until - at)) / (until - from);
  }
  return total > 0 ? after / total : 0;
}

/** Exponents of never being winded in each step, for windedAfter. */
export function windedExponents(byStep: ArrayLike<number>): Float64Array {
  return Float64Array.from(byStep, (p) => -Math.log1p(-Math.min(0.999999, Math.max(0, p))));
}

/** What sitting there before the window begins adds to the share of its exponent: as much a minute as the window's own mean. */
export function shareBefore(at: number, window: { startAt: number; endAt: number }): number {
  return Math.max(0, window.startAt - at) / Math.max(1, window.endAt - window.startAt);
}

/** Chance of being winded in the share of a sit's exponent that is left, from the whole sit's chance. */
export function windedIn(share: number, winded: number): number {
  return winded <= 0 ? 0 : 1 - (1 - Math.min(0.999999, winded)) ** share;
}
