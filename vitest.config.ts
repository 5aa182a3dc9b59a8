import { defineConfig } from 'vitest/config';

/** Laws and the server stand apart: the one takes minutes, the other needs PostgreSQL. */
const apart = ['tests/laws/**', 'tests/server/**', 'tests/architecture/**'];

export default defineConfig({
  test: {
    projects: [
      {
        extends: true,
        // A law may take its time on a busy machine: what is slow is for the benchmarks to say.
        test: {
          name: 'unit',
          include: ['tests/**/*.test.ts'],
          exclude: apart,
          testTimeout: 120_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'screens',
          include: ['tests/**/*.test.tsx'],
          environment: 'happy-dom',
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'architecture',
          include: ['tests/architecture/**/*.test.ts'],
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: { name: 'laws', include: ['tests/laws/**/*.test.ts'], testTimeout: 900_000 },
      },
      {
        extends: true,
        test: {
          name: 'server',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: ['tests/server/support/cluster-setup.ts'],
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
