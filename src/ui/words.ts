import type { Light } from './light';

/** Texts of the parts themselves: what stands on them in every feature alike. */

export const WATCH_WORDS = { lost: 'The server could not be reached. What is shown may be old.' } as const;

export const LAZY_WORDS = {
  title: 'This needs a signal',
  text: 'Its part of the page has not come yet. Press again when there is one.',
} as const;

export const FAULT_PAGE_WORDS = {
  heading: 'Something went wrong',
  title: 'Something went wrong on our side',
  text: 'Nothing you had saved is lost. Try again; if it stays, tell your club’s admin the reference below.',
  again: 'Try again',
  first: 'First page',
  reference: (code: string) => `Reference: ${code}`,
} as const;

export const LIGHT_NAMES: Record<Light, string> = { auto: 'Auto', day: 'Day', dark: 'Dark', dim: 'Dim red' };
