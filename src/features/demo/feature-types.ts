import type { FeatureKind, UseTable } from '@/core/ground-types';
import type { Spot } from './demo-place';

export interface DemoFeature {
  name: string;
  kind: FeatureKind;
  shape: { area: readonly Spot[] } | { line: readonly Spot[] } | { point: Spot };
  /** Months 1-12; left out: all year. */
  months?: number[];
  /** The steward's own shares in place of those of its kind. */
  use?: UseTable;
  /** Crops of this year and those before it. */
  rotation?: { yearsAgo: number; crop: string; months: number[] }[];
  notes?: string;
}
