/** 95 % intervals of counts and shares. */

export interface Interval {
  low: number;
  high: number;
}

const TAIL = 0.025;
/** Two-sided 95 % point of the normal distribution. */
const Z = 1.959964;
const HALVINGS = 80;

function logFactorial(n: number): number {
  let sum = 0;
  for (let k = 2; k <= n; k++) sum += Math.log(k);
  return sum;
}

/** P(X <= n) of a Poisson count, for a mean at or above n: terms fall from the last one down. */
function atMost(n: number, mean: number, logFact: number): number {
  let term = 1;
  let sum = 1;
  for (let k = n; k > 0 && term > 1e-17 * sum; k--) {
    term *= k / mean;
    sum += term;
  }
  return sum * Math.exp(n * Math.log(mean) - mean - logFact);
}

/** P(X >= n), for a mean at or below n: terms fall from the first one up. */
function atLeast(n: number, mean: number, logFact: number): number {
  let term = 1;
  let sum = 1;
  for (let k = n + 1; term > 1e-17 * sum; k++) {
    term *= mean / k;
    sum += term;
  }
  return sum * Math.exp(n * Math.log(mean) - mean - logFact);
}

/** The point between two at which a falling test turns false. */
function halve(from: number, to: number, holds: (at: number) => boolean): number {
  let [low, high] = [from, to];
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (low + high) / 2;
    if (holds(middle)) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Exact 95 % interval of the mean behind a Poisson count (Garwood 1936, Biometrika 28). Divide both ends by the exposure
 * for a rate. `count` is a whole number, 0 or more.
 */
export function countInterval(count: number): Interval {
  const logFact = logFactorial(count);
  const farthest = count + 12 + 10 * Math.sqrt(count);
  const low = count === 0 ? 0 : halve(0, count, (mean) => mean === 0 || atLeast(count, mean, logFact) < TAIL);
  const high = halve(count, farthest, (mean) => mean === 0 || atMost(count, mean, logFact) > TAIL);
  return { low, high };
}

/** 95 % score interval of a share, `some` of `all` (Wilson 1927, J. Am. Stat. Assoc. 22). `all` is above 0. */
export function shareInterval(some: number, all: number): Interval {
  const share = some / all;
  const z2 = Z * Z;
  const middle = (share + z2 / (2 * all)) / (1 + z2 / all);
  const half = (Z / (1 + z2 / all)) * Math.sqrt((share * (1 - share)) / all + z2 / (4 * all * all));
  return { low: some === 0 ? 0 : middle - half, high: some === all ? 1 : middle + half };
}

/**
 * 95 % interval of the ratio of two Poisson means, a to b: given their sum, a is a share of it (Przyborowski and Wilenski
 * 1940, Biometrika 31), taken with the score interval. `b` is above 0.
 */
export function ratioInterval(a: number, b: number): Interval {
  const { low, high } = shareInterval(a, a + b);
  return { low: low / (1 - low), high: high / (1 - high) };
}
