import type { FeatureKind } from '@/core/types';
import type { Spot } from './demo-place';

export interface DemoFeature {
  name: string;
  kind: FeatureKind;
  shape: { area: readonly Spot[] } | { line: readonly Spot[] } | { point: Spot };
  /** Months 1-12; left out: all year. */
  months?: number[];
  notes?: string;
}
