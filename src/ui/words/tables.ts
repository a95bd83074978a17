export const TABLE_WORDS = {
  shown: (found: number, total: number) => `${found} of ${total} shown`,
  nothingTitle: 'Nothing matches',
  nothing: (total: number) => `Try fewer letters, or clear the filter to see all ${total}.`,
  span: (from: number, to: number, total: number) => `${from}–${to} of ${total}`,
} as const;

export const PAGER_WORDS = {
  more: 'More of this list',
  page: (page: number, pages: number) => `Page ${page} of ${pages}`,
  previous: 'Previous',
  next: 'Next',
} as const;

export const CHART_WORDS = {
  legend: (title: string, bar: string) => `${title} Bar: ${bar}. Line: 95 % interval.`,
  name: (title: string) => `Chart: ${title} The table says the same.`,
} as const;
