import { defineConfig } from 'vitest/config';

const alias = {
  '@': import.meta.dirname,
  // Next's own marker; outside Next there is nothing to mark.
  'server-only': `${import.meta.dirname}/tests/support/server-only.ts`,
};

/** npm run verify has a minute: what goes through many whole designs is left to npm test. */
const thorough = [
  'tests/geometry/nesting/{nest,lay-out}.test.ts',
  'tests/geometry/parts/assembly.test.ts',
  'tests/geometry/cutting/offset.test.ts',
  'tests/geometry/examples.test.ts',
  'tests/geometry/derive.test.ts',
  'tests/geometry/advice/advise.test.ts',
  'tests/geometry/tolerance/stacks.test.ts',
  'tests/geometry/electrical/loss.test.ts',
];

export default defineConfig({
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: 'kernel',
          include: ['tests/{geometry,references,golden,floor,units,design}/**/*.test.ts'],
          exclude: thorough,
          testTimeout: 30_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'thorough',
          include: thorough,
          testTimeout: 30_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'house',
          include: ['tests/house/**/*.test.ts'],
          testTimeout: 60_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'routes',
          include: ['tests/routes/**/*.test.ts'],
          globalSetup: ['tests/support/cluster.ts'],
          setupFiles: ['tests/support/database.ts', 'tests/support/request-context.ts'],
          testTimeout: 20_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
