const TWO_OVER_SQRT_PI = 2 / Math.sqrt(Math.PI);

/** Below this the series, from it on the continued fraction; both hold 1e-14 here. */
const CROSSOVER = 2.5;

/** Abramowitz & Stegun 7.1.6: every term positive, so nothing cancels. */
function erfSeries(x: number): number {
  let term = x;
  let sum = x;
  for (let n = 1; n < 200; n++) {
    term *= (2 * x * x) / (2 * n + 1);
    sum += term;
    if (Math.abs(term) < 1e-17 * Math.abs(sum)) break;
  }
  return TWO_OVER_SQRT_PI * Math.exp(-x * x) * sum;
}

/** Abramowitz & Stegun 7.1.14, from the far end in. */
function erfcFraction(x: number): number {
  let tail = x;
  for (let k = 80; k >= 1; k--) tail = x + k / 2 / tail;
  return Math.exp(-x * x) / (tail * Math.sqrt(Math.PI));
}

/** Error function, any finite x or infinity; absolute error below 1e-13. */
export function erf(x: number): number {
  if (x < 0) return -erf(-x);
  if (x > 6) return 1;
  return x < CROSSOVER ? erfSeries(x) : 1 - erfcFraction(x);
}

/** 1 - erf(x) without loss for large x. */
export function erfc(x: number): number {
  if (x > 27) return 0;
  return x < CROSSOVER ? 1 - erf(x) : erfcFraction(x);
}

/** Chance that a standard normal value is at most z. */
export function normalCdf(z: number): number {
  return z < 0 ? 0.5 * erfc(-z / Math.SQRT2) : 1 - 0.5 * erfc(z / Math.SQRT2);
}
