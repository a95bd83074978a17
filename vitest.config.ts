import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url));

const alias = [
  { find: /^server-only$/, replacement: at('./tests/helpers/empty.ts') },
  { find: /^@\//, replacement: `${at('./src')}/` },
];

/** Next's request functions, answered from the request a test has set. */
const nextAlias = [
  { find: /^next\/headers$/, replacement: at('./tests/helpers/next-headers.ts') },
  { find: /^next\/cache$/, replacement: at('./tests/helpers/next-cache.ts') },
];

export default defineConfig({
  test: {
    projects: [
      {
        resolve: { alias },
        test: { name: 'unit', include: ['src/**/*.test.{ts,tsx}', 'scripts/**/*.test.ts'], environment: 'node' },
      },
      {
        resolve: { alias: [...alias, ...nextAlias] },
        test: {
          name: 'integration',
          include: ['tests/integration/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/helpers/template-database.ts'],
          setupFiles: ['tests/helpers/each-worker.ts'],
          testTimeout: 120_000,
          hookTimeout: 120_000,
          maxWorkers: 2,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          environment: 'node',
          setupFiles: ['tests/helpers/say-where.ts'],
          // A look that is repeated until it is true waits as long as a click does: a busy machine is slow, not wrong.
          expect: { poll: { timeout: 30_000 } },
          testTimeout: 240_000,
          hookTimeout: 240_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
