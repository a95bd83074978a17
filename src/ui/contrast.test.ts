import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const css = readFileSync(new URL('../app/globals.css', import.meta.url), 'utf8');

const block = (selector: string) => css.match(new RegExp(`\\n  ${selector} \\{([^}]*)\\}`))?.[1] ?? '';

/** Colours of a light by token name: day and dark stand side by side, dim by itself. */
function tokensOf(light: string): Record<string, string> {
  if (light === 'dim') {
    const own = block('\\[data-light="dim"\\]').matchAll(/--color-([\w-]+): (#[0-9a-f]{6})/g);
    return Object.fromEntries([...own].map(([, name, hex]) => [name, hex]));
  }
  const both = block('\\[data-light\\]').matchAll(/--color-([\w-]+): light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\)/g);
  return Object.fromEntries([...both].map(([, name, day, dark]) => [name, light === 'day' ? day : dark]));
}

/** Relative luminance, WCAG 2.2 glossary. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((i) => {
    const c = Number.parseInt(hex.slice(i, i + 2), 16) / 255;
    return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(a: string, b: string): number {
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high + 0.05) / (low + 0.05);
}

const TEXT_PAIRS = ['paper', 'panel', 'sunk'].flatMap((ground) =>
  ['ink', 'ink-soft', 'moss', 'clay'].map((text) => [text, ground] as const),
);

describe.each(['day', 'dark', 'dim'])('%s light', (light) => {
  const tokens = tokensOf(light);
  const ratio = (a: string, b: string) => contrast(tokens[a] ?? '', tokens[b] ?? '');

  it('has text at 4.5 : 1 or better (WCAG 2.2, 1.4.3)', () => {
    for (const [text, ground] of [
      ...TEXT_PAIRS,
      ['on-moss', 'moss-fill'] as const,
      ['on-clay', 'clay-fill'] as const,
    ]) {
      expect(ratio(text, ground), `${text} on ${ground}`).toBeGreaterThanOrEqual(4.5);
    }
  });

  it('has edges of controls at 3 : 1 or better (WCAG 2.2, 1.4.11)', () => {
    for (const ground of ['paper', 'panel']) {
      expect(ratio('rule-strong', ground), ground).toBeGreaterThanOrEqual(3);
    }
  });
});

it('knows black on white as 21 : 1', () => {
  expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 5);
});

it('keeps dim to red: no light in green or blue beyond a trace', () => {
  for (const [name, hex] of Object.entries(tokensOf('dim'))) {
    const green = Number.parseInt(hex.slice(3, 5), 16);
    const blue = Number.parseInt(hex.slice(5, 7), 16);
    expect(Math.max(green, blue), name).toBeLessThanOrEqual(0x56);
  }
});

it('sets every token of the theme in every light', () => {
  const names = Object.keys(tokensOf('day')).sort();
  expect(names.length).toBeGreaterThan(10);
  for (const light of ['dark', 'dim']) expect(Object.keys(tokensOf(light)).sort()).toEqual(names);
});
