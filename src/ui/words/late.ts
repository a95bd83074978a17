/** Said when a part of the page, or a newer answer, could not be had. */

export const LAZY_WORDS = {
  title: 'This needs a signal',
  text: 'Its part of the page has not come yet. Press again when there is one.',
} as const;

export const WATCH_WORDS = { lost: 'The server could not be reached. What is shown may be old.' } as const;
