import type { NumberRule } from '../read-number';

export const FORM_ERRORS = {
  number: ({ label, min, max, whole, unit }: NumberRule) =>
    `${label}: type ${whole ? 'a whole number' : 'a number'} from ${min} to ${max}${unit ? ` ${unit}` : ''}.`,
  needed: (label: string) => `${label} is needed.`,
} as const;
