import { getMoonIllumination } from 'suncalc';
import { MOON_NAMES, type MoonName } from './words/sky';

/** A principal phase is named within about a day and a half of its instant, as wall calendars do. */
const NEAR = 0.05;

/** The moon at an instant: lit share of its disc (0-1) and the phase's name. Shown beside a sit; it weighs nothing in any score. */
export function moonAt(at: number): { litShare: number; name: MoonName } {
  const { fraction, phase } = getMoonIllumination(new Date(at));
  const quarter = Math.round(phase * 4);
  const between = Math.floor(phase * 4);
  const index = Math.abs(phase - quarter / 4) <= NEAR ? (quarter % 4) * 2 : between * 2 + 1;
  return { litShare: fraction, name: MOON_NAMES[index] ?? MOON_NAMES[0] };
}
