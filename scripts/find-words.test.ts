import { describe, expect, it } from 'vitest';
import { findWords } from './find-words';

const texts = (source: string) => findWords('piece.tsx', source).map((found) => found.text);

/** `${minutes} min early`, put together so that it does not read as a template of ours. */
const EARLY = ['`$', '{minutes} min early`'].join('');

describe('findWords', () => {
  it('finds what a person reads or hears in markup', () => {
    expect(texts('<p title="Gone" aria-label="way out" className="flex gap-2">Out by dark</p>')).toEqual([
      'Gone',
      'way out',
      'Out by dark',
    ]);
    expect(texts(`<Text label={late ? 'Late' : ${EARLY}} />`)).toEqual(['Late', EARLY]);
  });

  it('finds refusals, messages of schemas, sentences in objects and mail subjects', () => {
    expect(texts("throw new AppError('conflict', taken ? 'Taken.' : 'Gone.', { log: 'a clash of sits' });")).toEqual([
      'Taken.',
      'Gone.',
    ]);
    expect(texts("const s = z.string().min(1, 'Write a name.');")).toEqual(['Write a name.']);
    expect(texts("const choice = { value: 'us', label: 'yards' };")).toEqual(['yards']);
    expect(texts(`queueMail(tx, { kind: 'sit.booked', subject: ${EARLY} });`)).toEqual([EARLY]);
  });

  it('passes over codes, class names, addresses, log lines and types', () => {
    const source = `
      'use client';
      import { a } from './some file';
      type Light = 'Day light' | 'dim light';
      const look = open ? 'flex items-center' : 'sm:hidden';
      const url = \`/clubs/\${club}/sits?day=\${day}\`;
      log.warn({ where }, 'unique violation');
      if (!String(error).includes('already exists')) await client.execute('PRAGMA journal_mode = WAL');
      if (event.key === 'Escape') throw new RangeError('No such day');
      noteChange(scope, tx, { subject: 'stand', verb: 'added' });
      const mark = <path d="M 0 0 L 4 4" transform={\`rotate(\${bearing} 4 4)\`} />;`;
    expect(texts(source)).toEqual([]);
  });

  it('tells the line', () => {
    expect(findWords('piece.ts', "const a = 1;\n\nconst b = 'Not here.';\n")).toEqual([{ line: 3, text: 'Not here.' }]);
  });
});
