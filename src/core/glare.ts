import type { PromiseSettings } from './promise/promise-settings';
import { sunInEyes } from './promise/sun-in-eyes';
import type { WindowFrame } from './window-frame';

export interface Glare {
  /** Mean sun in the eyes (0-1) of each step, under a clear sky. */
  byStep: Float64Array;
  /** First and last minute of it; null: none. */
  span: { from: number; to: number } | null;
}

/** Sun in a sitter's eyes, minute by minute, by where the seat faces. */
export function glareOf(facingDeg: number | null, frame: WindowFrame, s: PromiseSettings): Glare {
  const byStep = new Float64Array(frame.stepAts.length);
  let span: Glare['span'] = null;
  if (facingDeg === null) return { byStep, span };
  for (const { at, altitudeDeg, azimuthDeg, step } of frame.lowSun) {
    const glare = sunInEyes(facingDeg, altitudeDeg, azimuthDeg, s);
    if (glare <= 0) continue;
    const from = frame.stepAts[step] as number;
    const until = Math.min(frame.stepAts[step + 1] ?? frame.window.endAt, frame.window.endAt);
    byStep[step] = (byStep[step] as number) + (glare * 60_000) / Math.max(60_000, until - from);
    span = span ? { from: span.from, to: at } : { from: at, to: at };
  }
  return { byStep, span };
}
