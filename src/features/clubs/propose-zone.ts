import { isZone } from '@/core/day-time';
import { parseNumber } from './read-number';

/** The IANA zone at a place as typed; null where the numbers are no place. The table of zones loads when first asked. */
export async function proposeZone(latText: string, lonText: string): Promise<string | null> {
  const lat = parseNumber(latText);
  const lon = parseNumber(lonText);
  if (lat === null || lon === null || Math.abs(lat) > 90 || Math.abs(lon) > 180) return null;
  const { default: zoneAt } = await import('@photostructure/tz-lookup');
  const zone = zoneAt(lat, lon);
  return isZone(zone) ? zone : null;
}

/** Zones to choose from; the runtime's list holds one name of each, so the one in use is put in when it has another. */
export function zoneChoices(zones: readonly string[], inUse: string): string[] {
  return inUse === '' || zones.includes(inUse) ? [...zones] : [inUse, ...zones];
}
