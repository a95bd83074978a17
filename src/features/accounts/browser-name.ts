import { BROWSER_WORDS } from './words/forms';

/** First match wins: others' names are part of most browsers' own. */
const BROWSERS: [RegExp, string][] = [
  [/\bEdgA?\/|\bEdgiOS\//, BROWSER_WORDS.edge],
  [/\bOPR\/|\bOpera\b/, BROWSER_WORDS.opera],
  [/\bSamsungBrowser\//, BROWSER_WORDS.samsungInternet],
  [/\bFirefox\/|\bFxiOS\//, BROWSER_WORDS.firefox],
  [/\bHeadlessChrome\/|\bChrome\/|\bChromium\/|\bCriOS\//, BROWSER_WORDS.chrome],
  [/\bSafari\//, BROWSER_WORDS.safari],
];
const SYSTEMS: [RegExp, string][] = [
  [/\biPhone\b/, 'iPhone'],
  [/\biPad\b/, 'iPad'],
  [/\bAndroid\b/, BROWSER_WORDS.android],
  [/\bWindows\b/, BROWSER_WORDS.windows],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\bMacintosh\b/, BROWSER_WORDS.mac],
  [/\bLinux\b/, BROWSER_WORDS.linux],
];

const first = (table: [RegExp, string][], text: string) => table.find(([pattern]) => pattern.test(text))?.[1];

/** What a person would call the browser of a User-Agent header. */
export function browserName(userAgent: string): string {
  const browser = first(BROWSERS, userAgent);
  const system = first(SYSTEMS, userAgent);
  return BROWSER_WORDS.browserOn(browser, system);
}
