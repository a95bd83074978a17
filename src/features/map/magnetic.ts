import geomagnetism from 'geomagnetism';
import type { LatLon } from '@/core/geometry';

/**
 * Degrees that magnetic north lies east of true north (west is below nought), by the World Magnetic Model for the day
 * (NOAA/BGS WMM, good to about half a degree); null on a day that no model of the library covers.
 */
export function declinationDeg(at: LatLon, now: number): number | null {
  try {
    return geomagnetism.model(new Date(now)).point([at.lat, at.lon]).decl;
  } catch {
    return null;
  }
}
