import { cropIn } from '@/core/map-layers';
import type { FeatureRow } from './features-data';

/** Features as they are in a crop year: a field with a crop written down for it is used in that crop's months. */
export function featuresInYear(features: FeatureRow[], year: number): FeatureRow[] {
  return features.map((feature) => {
    const crop = feature.kind === 'crop' ? cropIn(feature.rotation, year) : null;
    return crop ? { ...feature, months: crop.months } : feature;
  });
}
