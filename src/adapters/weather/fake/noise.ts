/** Repeatable noise: the same numbers in give the same number out, in any order of asking. */

/** [0, 1) from whole numbers; the mixing steps of MurmurHash3 (Appleby, public domain). */
export function hashUnit(...parts: number[]): number {
  let h = 0x9747b28c;
  for (const part of parts) {
    let k = Math.imul(part | 0, 0xcc9e2d51);
    k = (k << 15) | (k >>> 17);
    h ^= Math.imul(k, 0x1b873593);
    h = (h << 13) | (h >>> 19);
    h = (Math.imul(h, 5) + 0xe6546b64) | 0;
  }
  h ^= h >>> 16;
  h = Math.imul(h, 0x85ebca6b);
  h ^= h >>> 13;
  h = Math.imul(h, 0xc2b2ae35);
  h ^= h >>> 16;
  return (h >>> 0) / 2 ** 32;
}

/** [-1, 1). */
export function hashSigned(...parts: number[]): number {
  return hashUnit(...parts) * 2 - 1;
}

/** 0 to 1 as x goes from 0 to 1, flat at both ends and beyond them. */
export function smoothStep(x: number): number {
  const t = Math.min(1, Math.max(0, x));
  return t * t * (3 - 2 * t);
}

/** Smooth in x, between -1 and 1, with a new knot at each whole number. */
export function noise(x: number, ...seed: number[]): number {
  const knot = Math.floor(x);
  const t = smoothStep(x - knot);
  return hashSigned(...seed, knot) * (1 - t) + hashSigned(...seed, knot + 1) * t;
}

/** Smooth in both x and y. */
export function noise2(x: number, y: number, ...seed: number[]): number {
  const knot = Math.floor(y);
  const t = smoothStep(y - knot);
  return noise(x, ...seed, knot) * (1 - t) + noise(x, ...seed, knot + 1) * t;
}
