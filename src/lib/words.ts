export const REQUEST_WORDS = {
  maybeOld: 'The server could not be reached. What is shown may be old.',
  lookAtConnection: 'The server could not be reached. Look at your connection and try again.',
} as const;

export const SENT_WORDS = {
  reload: 'Reload the page and try again.',
} as const;
