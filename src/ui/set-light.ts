import { LIGHT_COOKIE, type Light, lightPaper, parseLight, SUN_COOKIE, shownLight } from './light';

const YEAR_SECONDS = 365 * 24 * 3600;

function keepCookie(name: string, value: string, seconds: number): void {
  // biome-ignore lint/suspicious/noDocumentCookie: the Cookie Store API is missing from older phones
  document.cookie = [`${name}=${value}`, 'path=/', `max-age=${seconds}`, 'samesite=lax'].join('; ');
}

function readCookie(name: string): string | undefined {
  const start = `${name}=`;
  return document.cookie
    .split('; ')
    .find((cookie) => cookie.startsWith(start))
    ?.slice(start.length);
}

/** Draws the page in the light that is chosen, or that the sun says. */
function showLight(): void {
  const light = shownLight(parseLight(readCookie(LIGHT_COOKIE)), readCookie(SUN_COOKIE));
  document.documentElement.dataset.light = light;
  const paper = lightPaper(light);
  if (typeof paper !== 'string') return;
  for (const meta of document.querySelectorAll('meta[name="theme-color"]')) meta.setAttribute('content', paper);
}

/** Keeps the choice for the server's next page and shows it at once on this one. */
export function setLight(light: Light): void {
  keepCookie(LIGHT_COOKIE, light, YEAR_SECONDS);
  showLight();
}

/** Keeps what the sun says until it changes, and shows it where auto is chosen. */
export function setSunLight(light: 'day' | 'dark', untilMs: number): void {
  keepCookie(SUN_COOKIE, light, Math.max(1, Math.round(untilMs / 1000)));
  showLight();
}
