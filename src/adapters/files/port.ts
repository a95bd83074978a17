export interface KeptFile {
  key: string;
  /** Instant it was last written. */
  writtenAt: number;
}

/** Where files are kept. Keys are 'photos/club/id.jpg': letters, digits, '-', '_', '.', and '/' between parts. */
export interface FilesPort {
  readonly source: string;
  put(key: string, bytes: Uint8Array, type: string): Promise<void>;
  /** null: there is none. */
  get(key: string): Promise<Uint8Array | null>;
  /** What is gone already is no mistake. */
  remove(keys: string[]): Promise<void>;
  /** Everything whose key begins so. */
  list(prefix: string): AsyncIterable<KeptFile>;
}

const KEY = /^[A-Za-z0-9_-][A-Za-z0-9_.-]*(\/[A-Za-z0-9_-][A-Za-z0-9_.-]*)*$/;

/** Refuses anything that could point outside the files. */
export function checkKey(key: string): string {
  if (key.length > 200 || !KEY.test(key)) throw new Error(`No key of a file: ${key.slice(0, 60)}`);
  return key;
}
