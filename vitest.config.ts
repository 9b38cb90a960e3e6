import { defineConfig } from 'vitest/config';

const timeouts = { testTimeout: 60_000, hookTimeout: 60_000 };

export default defineConfig({
  test: {
    maxWorkers: 2,
    projects: [
      {
        test: {
          name: 'unit',
          environment: 'node',
          include: ['{shared,server,scripts}/**/*.test.ts', 'tests/published/**/*.test.ts', 'content/**/*.test.ts'],
          ...timeouts,
        },
      },
      {
        extends: './vite.config.ts',
        test: {
          name: 'client',
          environment: 'jsdom',
          include: ['src/**/*.test.{ts,tsx}'],
          setupFiles: ['tests/support/client-setup.ts'],
          ...timeouts,
        },
      },
      {
        test: {
          name: 'api',
          environment: 'node',
          include: ['tests/api/**/*.test.ts'],
          globalSetup: ['tests/support/database-server.ts'],
          ...timeouts,
        },
      },
      {
        test: {
          name: 'browser',
          environment: 'node',
          include: ['tests/browser/**/*.spec.ts'],
          globalSetup: ['tests/support/product.ts'],
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 120_000,
        },
      },
    ],
  },
});
