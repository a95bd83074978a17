import type { ScoreSettings } from './score';
import type { Confidence } from './verdict-types';
import { CONFIDENCE_WORDS } from './words/sit';

const HOUR_MS = 3_600_000;

/** How far the forecast looks ahead for a sit and how far its directions spread: what confidence is made of. */
export interface ForecastTrust {
  issuedAt: number;
  leadHours: number;
  /** Circular standard deviation of direction over the sit, degrees; null when the wind has no direction. */
  spreadDeg: number | null;
  /** Share of the sit's steps with no forecast of their own, 0-1. */
  missingShare: number;
}

/**
 * How sure a verdict is, from the spread of directions, the lead and the forecast's age at `now`. 'none' without a forecast.
 * Light and variable wind is low whatever the lead: centres do not even score direction under 3 m/s.
 */
export function confidenceFor(trust: ForecastTrust | null, now: number, s: ScoreSettings): Confidence {
  if (trust === null) {
    return { level: 'none', text: CONFIDENCE_WORDS.none, leadHours: null, spreadDeg: null, forecastAgeHours: null };
  }
  const age = Math.max(0, (now - trust.issuedAt) / HOUR_MS);
  const spread = trust.spreadDeg;
  const base = { leadHours: trust.leadHours, spreadDeg: spread, forecastAgeHours: age };
  if (spread === null) return { level: 'low', text: CONFIDENCE_WORDS.variable, ...base };
  const within = Math.max(5, Math.round(spread / 5) * 5);
  if (trust.missingShare > 0.25) return { level: 'low', text: CONFIDENCE_WORDS.gaps(within), ...base };
  if (age > s.staleHours * 2) return { level: 'low', text: CONFIDENCE_WORDS.old(Math.round(age), within), ...base };
  if (spread <= s.highSpreadDeg && trust.leadHours <= s.highLeadHours && age <= s.staleHours) {
    return { level: 'high', text: CONFIDENCE_WORDS.high(within), ...base };
  }
  if (spread <= s.fairSpreadDeg && trust.leadHours <= s.fairLeadHours) {
    return { level: 'fair', text: CONFIDENCE_WORDS.fair(Math.round(trust.leadHours), within), ...base };
  }
  const text =
    spread > s.fairSpreadDeg
      ? CONFIDENCE_WORDS.anywhere(within)
      : CONFIDENCE_WORDS.daysAhead(Math.round(trust.leadHours / 24), within);
  return { level: 'low', text, ...base };
}
