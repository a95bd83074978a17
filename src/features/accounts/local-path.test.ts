import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { localPath } from './local-path';

describe('localPath', () => {
  it('takes paths of this app', () => {
    expect(localPath('/clubs/hollow?day=2026-11-07#row')).toBe('/clubs/hollow?day=2026-11-07#row');
    expect(localPath('/')).toBe('/');
  });

  it.each([
    'https://elsewhere.test/',
    '//elsewhere.test',
    '/\\elsewhere.test',
    '/\t/elsewhere.test',
    '/..//elsewhere.test',
    '/.//elsewhere.test',
    'javascript:alert(1)',
    'clubs',
    '',
    undefined,
    ['/clubs'],
  ])('refuses %j', (next) => {
    expect(localPath(next)).toBeNull();
  });

  it('never leads off this host', () => {
    const parts = fc.constantFrom('/', '\\', '.', '..', '\t', '@', ':', 'elsewhere.test', 'https:', '?', '#', '%2f');
    fc.assert(
      fc.property(fc.array(parts, { maxLength: 8 }), (pieces) => {
        const path = localPath(pieces.join(''));
        if (path !== null) expect(new URL(path, 'https://windrest.test').host).toBe('windrest.test');
      }),
      { numRuns: 2000 },
    );
  });
});
