import type { LegalLightRule } from './booking/rules';
import { daylight, type Place } from './sun';

/**
 * The hours of a day by the club's own rule, from so many minutes before sunrise to so many after sunset, each to the
 * whole minute as printed tables give the sun; null where the sun does not rise or does not set. It is the rule the club
 * typed in with its source and date: state law decides, and nothing here declares a time legal.
 */
export function legalLight(
  rule: Pick<LegalLightRule, 'minutesBeforeSunrise' | 'minutesAfterSunset'>,
  day: string,
  place: Place,
): { startAt: number; endAt: number } | null {
  const sun = daylight(day, place);
  if (!sun) return null;
  return {
    startAt: sun.rise - rule.minutesBeforeSunrise * 60_000,
    endAt: sun.set + rule.minutesAfterSunset * 60_000,
  };
}
