/** Address of the item a path belongs to: the longest that is the path or one of its parents; null when none is. */
export function findCurrent(path: string, hrefs: readonly string[]): string | null {
  const parents = hrefs.filter((href) => path === href || path.startsWith(href.endsWith('/') ? href : `${href}/`));
  return parents.reduce<string | null>((best, href) => (best && best.length >= href.length ? best : href), null);
}
