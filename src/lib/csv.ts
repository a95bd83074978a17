/** Marks that begin a formula in a spreadsheet (OWASP, CSV Injection), with their full-width twins. */
const FORMULA = /^[\s\u00a0]*[=+\-@\t\r\n＝＋－＠]/;

/** A cell after RFC 4180; text that a spreadsheet would run as a formula is told to be text by an apostrophe. */
export function csvCell(value: string): string {
  const safe = FORMULA.test(value) ? `'${value}` : value;
  return /[",\r\n;\t']/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** Rows of cells as a file. The byte order mark makes spreadsheets read it as UTF-8. */
export function toCsv(rows: readonly (readonly string[])[]): string {
  return `\ufeff${rows.map((row) => row.map(csvCell).join(',')).join('\r\n')}\r\n`;
}
