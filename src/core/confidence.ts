import type { ScoreSettings } from './score';
import type { Confidence } from './types';

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
    return { level: 'none', text: 'No forecast', leadHours: null, spreadDeg: null, forecastAgeHours: null };
  }
  const age = Math.max(0, (now - trust.issuedAt) / HOUR_MS);
  const spread = trust.spreadDeg;
  const base = { leadHours: trust.leadHours, spreadDeg: spread, forecastAgeHours: age };
  if (spread === null) return { level: 'low', text: 'Wind light and variable: direction unknown', ...base };
  const about = `direction within about ${Math.max(5, Math.round(spread / 5) * 5)}°`;
  if (trust.missingShare > 0.25) return { level: 'low', text: `Forecast has gaps; ${about}`, ...base };
  if (age > s.staleHours * 2) return { level: 'low', text: `Forecast is ${Math.round(age)} h old; ${about}`, ...base };
  if (spread <= s.highSpreadDeg && trust.leadHours <= s.highLeadHours && age <= s.staleHours) {
    return { level: 'high', text: `Steady wind soon; ${about}`, ...base };
  }
  if (spread <= s.fairSpreadDeg && trust.leadHours <= s.fairLeadHours) {
    return { level: 'fair', text: `Forecast ${Math.round(trust.leadHours)} h ahead; ${about}`, ...base };
  }
  const why =
    spread > s.fairSpreadDeg ? 'Wind may come from almost anywhere' : `${Math.round(trust.leadHours / 24)} days ahead`;
  return { level: 'low', text: `${why}; ${about}`, ...base };
}
