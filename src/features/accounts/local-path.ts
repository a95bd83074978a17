/** A path inside this app, safe to lead to after signing in; null for anything that could lead elsewhere. */
export function localPath(next: unknown): string | null {
  if (typeof next !== 'string' || !/^\/(?![/\\])/.test(next) || /[\s\\\p{Cc}]/u.test(next)) return null;
  const base = 'http://here.invalid';
  if (!URL.canParse(next, base)) return null;
  const url = new URL(next, base);
  if (url.origin !== base || url.pathname.startsWith('//')) return null;
  return `${url.pathname}${url.search}${url.hash}`;
}
