import type { Sex } from '@/core/harvest/harvest-types';

export const DEER_KINDS = ['antlered_buck', 'other_buck', 'doe'] as const;
export type DeerKind = (typeof DEER_KINDS)[number];

export function deerKind(deer: { sex: Sex; antlered: boolean }): DeerKind {
  if (deer.sex === 'doe') return 'doe';
  return deer.antlered ? 'antlered_buck' : 'other_buck';
}
