import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';

/** The path of a file database; null for a server. */
export function databaseFile(url: string): string | null {
  return url.startsWith('file:') ? (url.slice('file:'.length).split('?')[0] ?? null) : null;
}

export function makeFolderFor(url: string): void {
  const file = databaseFile(url);
  if (file) mkdirSync(dirname(file), { recursive: true });
}
