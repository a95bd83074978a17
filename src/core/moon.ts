import { getMoonIllumination } from 'suncalc';

const NAMES = [
  'New moon',
  'Waxing crescent',
  'First quarter',
  'Waxing gibbous',
  'Full moon',
  'Waning gibbous',
  'Last quarter',
  'Waning crescent',
] as const;
export type MoonName = (typeof NAMES)[number];

/** A principal phase is named within about a day and a half of its instant, as wall calendars do. */
const NEAR = 0.05;

/** The moon at an instant: lit share of its disc (0-1) and the phase's name. Shown beside a sit; it weighs nothing in any score. */
export function moonAt(at: number): { litShare: number; name: MoonName } {
  const { fraction, phase } = getMoonIllumination(new Date(at));
  const quarter = Math.round(phase * 4);
  const between = Math.floor(phase * 4);
  const index = Math.abs(phase - quarter / 4) <= NEAR ? (quarter % 4) * 2 : between * 2 + 1;
  return { litShare: fraction, name: NAMES[index] ?? 'New moon' };
}
