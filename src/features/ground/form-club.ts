import type { LatLon } from '@/core/geometry';
import type { Units } from '@/core/units';

/** What a ground form must know of the club to read what is typed. */
export interface FormClub extends LatLon {
  units: Units;
}

/** Only what forms need leaves the server. */
export function formClubOf({ lat, lon, units }: FormClub): FormClub {
  return { lat, lon, units };
}
