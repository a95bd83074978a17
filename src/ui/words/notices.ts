export const NOTICE_WORDS = { info: 'Note', caution: 'Caution', stop: 'Stop' } as const;

export const ERROR_STATE_WORDS = {
  title: 'That did not work',
  reference: (code: string) => `Reference: ${code}`,
} as const;

export const LOADING_WORDS = { loading: 'Loading' } as const;
