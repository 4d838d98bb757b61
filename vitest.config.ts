import { defineConfig } from 'vitest/config';

const alias = { '@': import.meta.dirname };
const everywhere = ['node_modules/**', '.next/**', '.plumbrow*/**', 'tests/browser/**'];

export default defineConfig({
  test: {
    projects: [
      {
        resolve: { alias },
        oxc: { jsx: { runtime: 'automatic' } },
        test: {
          name: 'pure',
          include: ['tests/**/*.test.{ts,tsx}'],
          exclude: [...everywhere, '**/*.db.test.ts'],
          environment: 'node',
          // What is pure leaves nothing behind for the next file: one set of modules a thread is twice as fast.
          pool: 'threads',
          isolate: false,
          testTimeout: 30_000,
        },
      },
      {
        resolve: { alias },
        test: {
          // Against PostgreSQL: each file has a database of its own (tests/support/database.ts).
          name: 'db',
          include: ['tests/**/*.db.test.ts'],
          exclude: everywhere,
          environment: 'node',
          pool: 'forks',
          globalSetup: ['tests/support/cluster-setup.ts'],
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
