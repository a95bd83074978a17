import type { FilesPort } from '@/adapters/files/port';

/** Files in memory: nothing to tidy up after a test. */
export function makeMemoryFiles(): FilesPort {
  const kept = new Map<string, { bytes: Uint8Array; at: number }>();
  return {
    source: 'memory',
    put: async (key, bytes) => {
      kept.set(key, { bytes, at: Date.now() });
    },
    get: async (key) => kept.get(key)?.bytes ?? null,
    remove: async (keys) => {
      for (const key of keys) kept.delete(key);
    },
    async *list(prefix) {
      for (const [key, { at }] of kept) if (key.startsWith(prefix)) yield { key, writtenAt: at };
    },
  };
}
