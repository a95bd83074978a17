import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { type DataColumn, DataTable } from './data-table';
import { compareValues, rowMatches } from './data-table-values';

interface Plot {
  name: string;
  acres: number | null;
}
const columns: DataColumn<Plot>[] = [
  { id: 'name', header: 'Name', value: (row) => row.name },
  { id: 'acres', header: 'Acres', value: (row) => row.acres, align: 'right', cell: (row) => row.acres?.toFixed(1) },
];
const rows: Plot[] = [
  { name: 'Plot 10', acres: 2 },
  { name: 'Plot 2', acres: null },
  { name: 'Ávila corner', acres: 11 },
];

function namesShown(markup: string): string[] {
  return [...markup.matchAll(/scope="row"[^>]*>([^<]*)</g)].map((m) => m[1] ?? '');
}

describe('compareValues', () => {
  it('sorts numbers in text by size and nothing first', () => {
    expect(['Plot 10', 'Plot 2', null].toSorted(compareValues)).toEqual([null, 'Plot 2', 'Plot 10']);
    expect([10, 9, 100].toSorted(compareValues)).toEqual([9, 10, 100]);
  });
});

describe('rowMatches', () => {
  it('wants every word, whatever case or accents, in text columns only', () => {
    const found = (query: string) => rows.filter((row) => rowMatches(row, columns, query)).map((row) => row.name);
    expect(found('avila')).toEqual(['Ávila corner']);
    expect(found('CORNER av')).toEqual(['Ávila corner']);
    expect(found('corner plot')).toEqual([]);
    expect(found('11')).toEqual([]);
    expect(found(' ')).toHaveLength(3);
  });
});

describe('DataTable', () => {
  it('sorts from the start and says so to a screen reader', () => {
    const markup = renderToStaticMarkup(
      <DataTable
        caption="Plots"
        rows={rows}
        columns={columns}
        rowId={(row) => row.name}
        initialSort={{ id: 'name' }}
      />,
    );
    expect(namesShown(markup)).toEqual(['Ávila corner', 'Plot 2', 'Plot 10']);
    expect(markup.match(/aria-sort="ascending"/g)).toHaveLength(1);
    expect(markup).toContain('data-label="Acres"');
  });

  it('sorts numbers downward', () => {
    const markup = renderToStaticMarkup(
      <DataTable
        caption="Plots"
        rows={rows}
        columns={columns}
        rowId={(row) => row.name}
        initialSort={{ id: 'acres', desc: true }}
      />,
    );
    expect(namesShown(markup)).toEqual(['Ávila corner', 'Plot 10', 'Plot 2']);
  });

  it('pages', () => {
    const many = Array.from({ length: 61 }, (_, i) => ({ name: `Plot ${i + 1}`, acres: i }));
    const markup = renderToStaticMarkup(
      <DataTable caption="Plots" rows={many} columns={columns} rowId={(row) => row.name} pageSize={25} />,
    );
    expect(namesShown(markup)).toHaveLength(25);
    expect(markup).toContain('1–25 of 61');
  });

  it('shows the empty state in place of an empty table', () => {
    const markup = renderToStaticMarkup(
      <DataTable caption="Plots" rows={[]} columns={columns} rowId={(row) => row.name} empty={<p>Add one</p>} />,
    );
    expect(markup).toBe('<p>Add one</p>');
  });
});
