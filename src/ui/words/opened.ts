import type { Light } from '../light';

/** Texts of what opens: dialogs, menus, messages. */

export const DIALOG_WORDS = { close: 'Close' } as const;

export const CONFIRM_WORDS = { keep: 'Keep as it is', working: 'Working…' } as const;

export const LIGHT_NOTES: Record<Light, string> = {
  auto: 'by the sun',
  day: 'paper',
  dark: 'for the evening',
  dim: 'red on black, keeps night eyes',
};

export const TOAST_WORDS = { message: 'Message', close: 'Close message' } as const;

export const KEY_LIST_WORDS = {
  title: 'Keys',
  list: 'This list',
  next: 'Next stand of the list',
  before: 'Stand before it',
  enter: 'Enter',
  open: 'Open or fold the stand',
  earlier: 'The window before',
  later: 'The window after',
  esc: 'Esc',
  close: 'Close what is open',
  goTo: (place: string) => `Go to ${place}`,
  use: 'Use these keys',
  useHint: 'Turn them off if your screen reader or voice control uses the same ones.',
} as const;
