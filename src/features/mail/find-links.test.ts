import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findLinks } from './find-links';

describe('findLinks', () => {
  it('finds addresses and leaves the full stop out', () => {
    expect(findLinks('Open http://a.test/b?c=1. Or (https://d.test).')).toEqual([
      { kind: 'text', text: 'Open ' },
      { kind: 'link', text: 'http://a.test/b?c=1' },
      { kind: 'text', text: '. Or (' },
      { kind: 'link', text: 'https://d.test' },
      { kind: 'text', text: ').' },
    ]);
  });

  it('loses nothing of any text', () => {
    const word = fc.oneof(fc.string(), fc.webUrl());
    fc.assert(
      fc.property(fc.array(word), (words) => {
        const text = words.join(' ');
        return (
          findLinks(text)
            .map((piece) => piece.text)
            .join('') === text
        );
      }),
    );
  });
});
