import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { lightPaper, parseLight, shownLight } from './light';

const css = readFileSync(new URL('../app/globals.css', import.meta.url), 'utf8');

it('takes anything unknown as auto', () => {
  expect(parseLight('dim')).toBe('dim');
  expect(parseLight(undefined)).toBe('auto');
  expect(parseLight('"><script>')).toBe('auto');
});

it('follows the sun only where auto is chosen, and the device where the sun is not known', () => {
  expect(shownLight('auto', 'dark')).toBe('dark');
  expect(shownLight('dim', 'day')).toBe('dim');
  expect(shownLight('auto', undefined)).toBe('auto');
  expect(shownLight('auto', '"><script>')).toBe('auto');
});

it("gives the browser's frame the paper of the style sheet", () => {
  const [, day, dark] = css.match(/--color-paper: light-dark\((#\w+), (#\w+)\)/) ?? [];
  const dim = css.match(/\[data-light="dim"\] \{[^}]*--color-paper: (#\w+)/)?.[1];
  expect([lightPaper('day'), lightPaper('dark'), lightPaper('dim')]).toEqual([day, dark, dim]);
  expect(lightPaper('auto')).toEqual([
    { media: '(prefers-color-scheme: light)', color: lightPaper('day') },
    { media: '(prefers-color-scheme: dark)', color: lightPaper('dark') },
  ]);
});
