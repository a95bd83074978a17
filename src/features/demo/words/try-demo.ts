export const TRY_DEMO_WORDS = {
  open: 'Try the demo club',
  opening: 'Opening the demo…',
  lost: 'The server could not be reached. Try again.',
} as const;
