export type SortValue = string | number | boolean | null | undefined;

const words = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

/** Order of two cells: numbers by size, text as people sort it ('Stand 2' before 'Stand 10'), nothing before all else. */
export function compareValues(a: SortValue, b: SortValue): number {
  const [aNone, bNone] = [isNone(a), isNone(b)];
  if (aNone || bNone) return Number(bNone) - Number(aNone);
  if (typeof a === 'number' && typeof b === 'number') return a - b;
  return words.compare(String(a), String(b));
}

function isNone(value: SortValue): boolean {
  return value === null || value === undefined || value === '';
}

/** Whether every word of a query stands somewhere in the row's text columns, whatever its case or accents. */
export function rowMatches<Row>(
  row: Row,
  columns: readonly { value: (row: Row) => SortValue; filterable?: boolean }[],
  query: string,
): boolean {
  const wanted = plain(query).split(/\s+/).filter(Boolean);
  if (wanted.length === 0) return true;
  const text = columns
    .map((column) => ({ value: column.value(row), filterable: column.filterable }))
    .filter(({ value, filterable }) => filterable ?? typeof value === 'string')
    .map(({ value }) => plain(String(value ?? '')))
    .join('\n');
  return wanted.every((word) => text.includes(word));
}

function plain(text: string): string {
  return text
    .normalize('NFD')
    .replace(/\p{Diacritic}/gu, '')
    .toLowerCase();
}
