import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { composeMail, escapeHtml } from './compose';

describe('composeMail', () => {
  it('says the same in text and HTML, with the club at the foot', () => {
    const { text, html } = composeMail({
      paragraphs: ['You sit at Oak Flat.'],
      facts: [{ label: 'Window', value: 'evening' }],
      button: { label: 'See the sit', url: 'http://127.0.0.1:3000/sits/1' },
      after: ['Sit quiet.'],
      clubName: 'Hollow Creek',
      footer: 'You get this because you booked.',
    });
    expect(text).toBe(
      'You sit at Oak Flat.\n\nWindow: evening\n\nSee the sit:\nhttp://127.0.0.1:3000/sits/1\n\nSit quiet.\n\n' +
        '-- \nYou get this because you booked.\nHollow Creek, by Windrest\n',
    );
    for (const words of ['You sit at Oak Flat.', 'evening', 'See the sit', 'Sit quiet.', 'Hollow Creek, by Windrest']) {
      expect(html).toContain(words);
    }
    expect(html).toContain('href="http://127.0.0.1:3000/sits/1"');
  });

  it('lets nothing typed become markup', () => {
    const { html, text } = composeMail({ paragraphs: ['<img src=x onerror="a()"> & \'b\''], clubName: '<b>Club</b>' });
    expect(html).toContain('&lt;img src=x onerror=&quot;a()&quot;&gt; &amp; &#39;b&#39;');
    expect(html).toContain('&lt;b&gt;Club&lt;/b&gt;');
    expect(text).toContain('<img src=x');
  });

  it('escapes any text so that no sign of markup is left', () => {
    fc.assert(fc.property(fc.string(), (typed) => !/[<>"']|&(?!amp;|lt;|gt;|quot;|#39;)/.test(escapeHtml(typed))));
  });

  it('refuses a button that leads anywhere but the web', () => {
    const button = { label: 'Go', url: 'javascript:alert(1)' };
    expect(() => composeMail({ paragraphs: [], button, clubName: null })).toThrow('no web address');
  });
});
