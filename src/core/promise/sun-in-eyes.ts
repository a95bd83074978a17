import { apartDeg } from '../angles';
import type { PromiseSettings } from './promise-settings';

/** A minute with the sun low: the only ones that matter here. */
export interface LowSunMinute {
  at: number;
  altitudeDeg: number;
  azimuthDeg: number;
}

/** 0-1: how far the sun stands in the sitter's eyes; 1 straight ahead on the horizon. Facing null: he turns away from it. */
export function sunInEyes(
  facingDeg: number | null,
  altitudeDeg: number,
  azimuthDeg: number,
  s: PromiseSettings,
): number {
  if (facingDeg === null || altitudeDeg <= -0.3 || altitudeDeg >= s.sunAltitudeDeg) return 0;
  const off = apartDeg(facingDeg, azimuthDeg);
  if (off >= s.sunTurnDeg) return 0;
  const height = 1 - Math.max(0, altitudeDeg) / s.sunAltitudeDeg;
  return Math.sqrt(height) * Math.min(1, (2 * (s.sunTurnDeg - off)) / s.sunTurnDeg);
}

/** 1 under a clear sky, 0 under cloud; an unknown sky is taken as half clear. */
export function clearShare(cloudPercent: number | null, s: PromiseSettings): number {
  if (cloudPercent === null) return 0.5;
  const half = s.sunCloudPercent / 2;
  return Math.min(1, Math.max(0, 1 - (cloudPercent - half) / half));
}
