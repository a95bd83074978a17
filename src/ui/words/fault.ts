export const FAULT_PAGE_WORDS = {
  heading: 'Something went wrong',
  title: 'Something went wrong on our side',
  text: 'Nothing you had saved is lost. Try again; if it stays, tell your club’s admin the reference below.',
  again: 'Try again',
  first: 'First page',
  reference: (code: string) => `Reference: ${code}`,
} as const;
