/** The three lights of the screen, and auto: day and dark by the sun at the club, or as the device has it where none is known. */
export const LIGHTS = ['auto', 'day', 'dark', 'dim'] as const;
export type Light = (typeof LIGHTS)[number];

export const LIGHT_COOKIE = 'light';
/** What the sun says now; it ends with the next sunrise or sunset. */
export const SUN_COOKIE = 'light_by_sun';

export function parseLight(value: string | undefined): Light {
  return LIGHTS.find((light) => light === value) ?? 'auto';
}

/** The light to draw a page in: the one chosen, or for auto what the sun says, if that is known. */
export function shownLight(chosen: Light, bySun: string | undefined): Light {
  if (chosen !== 'auto') return chosen;
  return bySun === 'day' || bySun === 'dark' ? bySun : 'auto';
}

const PAPER = { day: '#f4efe3', dark: '#171a16', dim: '#000000' };

/** Paper colour for the browser's own frame, in the form Next's viewport takes. */
export function lightPaper(light: Light): string | { media: string; color: string }[] {
  if (light !== 'auto') return PAPER[light];
  return [
    { media: '(prefers-color-scheme: light)', color: PAPER.day },
    { media: '(prefers-color-scheme: dark)', color: PAPER.dark },
  ];
}
