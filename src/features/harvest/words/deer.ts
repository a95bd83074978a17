import type { AgeClass, AgeMethod, Sex } from '@/core/harvest/harvest-types';
import type { DeerKind } from '../deer-kind';

export const AGE_WORDS: Record<AgeClass, string> = {
  fawn: 'Fawn',
  '1.5': '1½ years',
  '2.5': '2½ years',
  '3.5': '3½ years',
  '4.5': '4½ years',
  '5.5_plus': '5½ years or more',
};

export const AGE_METHOD_WORDS: Record<AgeMethod, string> = {
  teeth: 'Teeth: replacement and wear',
  tooth_rings: 'Rings of a tooth, counted by a laboratory',
  body: 'Looks of the body',
};

export const DEER_KIND_WORDS: Record<DeerKind, string> = {
  antlered_buck: 'Antlered buck',
  other_buck: 'Buck without antlers',
  doe: 'Doe',
};

export const SEX_WORDS: Record<Sex, string> = { buck: 'Bucks', doe: 'Does' };
