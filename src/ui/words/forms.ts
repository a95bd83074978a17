export const FIELD_WORDS = { optional: ' (optional)' } as const;

export const FORM_WORDS = {
  wrong: 'Please put these right',
  working: 'Working…',
  lost: 'The server could not be reached. What you typed is still here: try again.',
} as const;

export const STEPPER_WORDS = {
  less: (label: string) => `One less: ${label}`,
  more: (label: string) => `One more: ${label}`,
} as const;

export const COPY_WORDS = {
  copied: 'Copied',
  selected: 'Selected: copy it now',
  show: 'Show',
  hide: 'Hide',
  copy: 'Copy',
} as const;
