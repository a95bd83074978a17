import { describe, expect, it } from 'vitest';
import { browserName } from './browser-name';

/** Shapes of the header: values from memory. */
const CASES: [string, string][] = [
  ['Mozilla/5.0 (X11; Linux x86_64; rv:130.0) Gecko/20100101 Firefox/130.0', 'Firefox on Linux'],
  [
    'Mozilla/5.0 (Linux; Android 14; K) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/128.0.0.0 Mobile Safari/537.36',
    'Chrome on Android',
  ],
  [
    'Mozilla/5.0 (iPhone; CPU iPhone OS 17_5 like Mac OS X) AppleWebKit/605.1.15 (KHTML, like Gecko) Version/17.5 Mobile/15E148 Safari/604.1',
    'Safari on iPhone',
  ],
  [
    'Mozilla/5.0 (Windows NT 10.0; Win64; x64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/128.0.0.0 Safari/537.36 Edg/128.0.0.0',
    'Edge on Windows',
  ],
  ['curl/8.5.0', 'A browser we do not know'],
];

describe('browserName', () => {
  it.each(CASES)('%s', (userAgent, name) => {
    expect(browserName(userAgent)).toBe(name);
  });
});
