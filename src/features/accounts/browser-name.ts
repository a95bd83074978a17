/** First match wins: others' names are part of most browsers' own. */
const BROWSERS: [RegExp, string][] = [
  [/\bEdgA?\/|\bEdgiOS\//, 'Edge'],
  [/\bOPR\/|\bOpera\b/, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\bFirefox\/|\bFxiOS\//, 'Firefox'],
  [/\bHeadlessChrome\/|\bChrome\/|\bChromium\/|\bCriOS\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
];
const SYSTEMS: [RegExp, string][] = [
  [/\biPhone\b/, 'iPhone'],
  [/\biPad\b/, 'iPad'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\bMacintosh\b/, 'Mac'],
  [/\bLinux\b/, 'Linux'],
];

const first = (table: [RegExp, string][], text: string) => table.find(([pattern]) => pattern.test(text))?.[1];

/** What a person would call the browser of a User-Agent header. */
export function browserName(userAgent: string): string {
  const browser = first(BROWSERS, userAgent);
  const system = first(SYSTEMS, userAgent);
  if (!browser && !system) return 'A browser we do not know';
  return `${browser ?? 'A browser'} on ${system ?? 'a device we do not know'}`;
}
