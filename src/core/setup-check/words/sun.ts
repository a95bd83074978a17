import type { WindowName } from '../../condition-types';

const oneWindow: Record<WindowName, string> = { morning: 'a morning', evening: 'an evening' };

/** Seats and cameras in the low sun. Clocks, months and directions come written out. */
export const SUN_WORDS = {
  when: (from: string, to: string, months: readonly string[]) => `${from} to ${to} in ${months.join(', ')}`,
  turn: (what: string, to: string) => `Turn ${what} to face ${to}`,
  seat: (stand: string, window: WindowName, when: string) => `${stand} faces the low sun on clear ${window}s, ${when}`,
  /** `better` null: no direction keeps the sun out. */
  whySeat: (minutes: number, window: WindowName, better: string | null) =>
    `The sitter is blinded and lit up for as long as ${minutes} minutes of ${oneWindow[window]}.${better === null ? '' : ` Facing ${better} avoids it.`}`,
  brushIn: (stand: string, window: WindowName) => `Brush in ${stand} against the ${window} sun`,
  unnamedCamera: 'A camera',
  camera: (name: string, when: string) => `${name} looks into the low sun, ${when}`,
  whyCamera: (to: string) => `Pictures wash out and the sun sets it off. Facing ${to} keeps it out of the picture.`,
  anotherWay: 'another way',
} as const;
