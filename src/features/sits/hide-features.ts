import type { ScoredFeature } from '@/core/ground-types';
import { FEATURE_WORDS } from './words/terms';

/**
 * Features under the plain name of their kind, for those who may not know what lies where. Done before anything is scored,
 * so that no sentence made from a feature can name it.
 */
export function hideFeatures(features: ScoredFeature[]): ScoredFeature[] {
  return features.map((feature) => ({ ...feature, name: FEATURE_WORDS[feature.kind] }));
}
