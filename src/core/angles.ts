/** Angles in degrees clockwise from true north. */

const RAD = Math.PI / 180;

export function toRad(deg: number): number {
  return deg * RAD;
}

/** Any finite angle to [0, 360). */
export function normalizeDeg(deg: number): number {
  const turned = deg % 360;
  return turned < 0 ? turned + 360 : turned + 0;
}

/** Signed turn from a to b, (-180, 180]; positive is clockwise. */
export function turnDeg(a: number, b: number): number {
  const d = normalizeDeg(b - a);
  return d > 180 ? d - 360 : d;
}

/** Smallest angle between two directions, 0-180. */
export function apartDeg(a: number, b: number): number {
  return Math.abs(turnDeg(a, b));
}

/** Where scent goes for a wind from `fromDeg`. */
export function downwindDeg(fromDeg: number): number {
  return normalizeDeg(fromDeg + 180);
}

/** Wind blowing from a direction as the east and north parts of the air's own movement, same unit as speed. */
export function windVector(fromDeg: number, speed: number): { east: number; north: number } {
  return { east: -speed * Math.sin(toRad(fromDeg)), north: -speed * Math.cos(toRad(fromDeg)) };
}

/** Inverse of windVector; direction null when the air stands still. */
export function windFromVector(east: number, north: number): { fromDeg: number | null; speed: number } {
  const speed = Math.hypot(east, north);
  if (speed < 1e-9) return { fromDeg: null, speed: 0 };
  return { fromDeg: normalizeDeg(Math.atan2(-east, -north) / RAD), speed };
}
