import type { ShelterClass } from '../ground-types';
import type { AirSettings } from '../settings';

/**
 * NWCG wind adjustment factors on 20-ft wind (Firefighter Math 8.2; the 0.1 was read, the rest are values from memory):
 * unsheltered, partly sheltered, open stand, dense stand. They already hold the drop from 20 ft to eye level, so the
 * core uses each as a share of the unsheltered one and takes height from the power law.
 */
export const NWCG_FACTORS: Record<ShelterClass, number> = { open: 0.4, edge: 0.3, open_wood: 0.2, dense_wood: 0.1 };

/** Wind under this shelter as a share of open wind at the same height, 0-1 whatever the settings hold. */
export function shelterShare(shelter: ShelterClass, settings: AirSettings): number {
  const share = settings.shelterShare[shelter];
  return Number.isFinite(share) ? Math.max(0, Math.min(1, share)) : 1;
}
