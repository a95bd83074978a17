import { describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS, SETTING_NOTES } from './settings';

function paths(value: object, prefix = ''): string[] {
  return Object.entries(value).flatMap(([key, inner]: [string, unknown]) => {
    const path = prefix ? `${prefix}.${key}` : key;
    return inner !== null && typeof inner === 'object' && !Array.isArray(inner) ? paths(inner, path) : [path];
  });
}

describe('settings', () => {
  const all = paths(DEFAULT_SETTINGS);
  it.each(all)('%s says what it rests on', (path) => {
    const noted = Object.keys(SETTING_NOTES).some(
      (key) => key === path || (key.endsWith('*') && path.startsWith(key.slice(0, -1))),
    );
    expect(noted).toBe(true);
  });
  it('has no note for a setting that is gone', () => {
    for (const key of Object.keys(SETTING_NOTES)) {
      const start = key.endsWith('*') ? key.slice(0, -1) : key;
      expect(all.some((path) => (key.endsWith('*') ? path.startsWith(start) : path === start))).toBe(true);
    }
  });
});
