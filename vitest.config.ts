import { defineConfig } from 'vitest/config';

/** Files share a worker's modules: three times as fast, and a test that leans on another's leftovers is a defect anyway. */
const shared = { isolate: false, pool: 'threads' } as const;

const unit = (name: string, root: string, environment: 'node' | 'happy-dom' = 'node') => ({
  test: { name, root, environment, include: ['src/**/*.test.{ts,tsx}'], exclude: ['**/*.db.test.ts'], ...shared },
});

/** `.test.ts` needs nothing, `.db.test.ts` needs PostgreSQL; the browser's `.spec.ts` belong to Playwright. */
export default defineConfig({
  test: {
    reporters: ['default', './tests/support/plain-reporter.ts'],
    maxWorkers: 2,
    projects: [
      unit('valuation', 'packages/valuation'),
      unit('contracts', 'packages/contracts'),
      unit('ui', 'packages/ui', 'happy-dom'),
      unit('client', 'packages/client', 'happy-dom'),
      unit('fakes', 'packages/fakes'),
      unit('api', 'apps/api'),
      unit('buyer', 'apps/buyer', 'happy-dom'),
      unit('seller', 'apps/seller', 'happy-dom'),
      unit('desk', 'apps/desk', 'happy-dom'),
      {
        test: {
          name: 'reference',
          root: 'tests',
          include: ['reference/**/*.test.ts', 'project/**/*.test.ts'],
          ...shared,
        },
      },
      {
        test: {
          name: 'db',
          root: 'apps/api',
          include: ['src/**/*.db.test.ts'],
          globalSetup: ['./test/global-setup.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
          maxWorkers: 2,
        },
      },
    ],
  },
});
