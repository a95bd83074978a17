import type { Light } from '../light';

/** Texts of the frame round every page. */

export const NAME = 'Windrest';

export const SHELL_WORDS = {
  home: 'Windrest, first page',
  pages: 'Pages',
  skip: 'Skip to the page',
} as const;

export const MORE_WORDS = { more: 'More', morePages: 'More pages' } as const;

export const LIGHT_NAMES: Record<Light, string> = { auto: 'Auto', day: 'Day', dark: 'Dark', dim: 'Dim red' };

export const LIGHT_WORDS = { light: 'Light: ' } as const;

export const KEYS_BUTTON_WORDS = { keys: 'Keys' } as const;
