import { fileURLToPath } from 'node:url';

import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('..', import.meta.url));

/** Component tests are not here: Angular's own builder compiles and runs them (`ng test`). */
export default defineConfig({
  root,
  test: {
    root,
    setupFiles: ['test/support/property-seed.ts'],
    projects: [
      {
        extends: true,
        test: { name: 'engine', include: ['shared/**/*.spec.ts', 'test/reference/**/*.spec.ts'] },
      },
      {
        extends: true,
        test: {
          name: 'api',
          include: ['server/**/*.spec.ts', 'test/{api,support}/**/*.spec.ts'],
          globalSetup: 'test/support/database-setup.ts',
          testTimeout: 20_000,
          hookTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          include: ['test/e2e/**/*.spec.ts'],
          globalSetup: 'test/support/product-setup.ts',
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 120_000,
        },
      },
    ],
  },
});
