import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { csvCell, toCsv } from './csv';

/** A reader of RFC 4180 written apart from the writer: one state, one character at a time. */
function readCsv(text: string): string[][] {
  const rows: string[][] = [[]];
  let cell = '';
  let quoted = false;
  for (let i = 0; i < text.length; i++) {
    const sign = text[i] ?? '';
    if (quoted) {
      if (sign === '"' && text[i + 1] === '"') {
        cell += '"';
        i += 1;
      } else if (sign === '"') quoted = false;
      else cell += sign;
    } else if (sign === '"') quoted = true;
    else if (sign === ',') {
      rows.at(-1)?.push(cell);
      cell = '';
    } else if (sign === '\r' && text[i + 1] === '\n') {
      rows.at(-1)?.push(cell);
      cell = '';
      i += 1;
      if (i + 1 < text.length) rows.push([]);
    } else cell += sign;
  }
  return rows;
}

describe('csvCell', () => {
  // Marks named by OWASP, CSV Injection.
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '\n=1', ' =1', '＝1', '＠x'])('tames %j', (value) => {
    const [[cell] = []] = readCsv(`${csvCell(value)}\r\n`);
    expect(cell).toBe(`'${value}`);
  });

  it('leaves plain text as it is', () => {
    expect(csvCell('Creek Ladder')).toBe('Creek Ladder');
    expect(csvCell('2026-11-07')).toBe('2026-11-07');
  });
});

describe('toCsv', () => {
  it('comes back whole, and no cell begins a formula', () => {
    const rows = fc.array(fc.array(fc.string({ unit: 'binary' }), { minLength: 2, maxLength: 4 }), { minLength: 1 });
    fc.assert(
      fc.property(rows, (given) => {
        const file = toCsv(given);
        expect(file.startsWith('\ufeff')).toBe(true);
        const back = readCsv(file.slice(1));
        back.forEach((row, i) => {
          row.forEach((cell, j) => {
            const original = given[i]?.[j];
            expect([original, `'${original}`]).toContain(cell);
            expect(cell).not.toMatch(/^\s*[=+\-@]/);
          });
        });
        expect(back.map((row) => row.length)).toEqual(given.map((row) => row.length));
      }),
    );
  });
});
