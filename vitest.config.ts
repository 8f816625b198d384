import { configDefaults, defineConfig } from 'vitest/config';

/** Tests that take minutes; only `npm run test:long` runs them, and it runs nothing else. */
const LONG = 'test/**/*.long.test.ts';
/** Tests of what is built: `dist` is made first where it is out of date. */
const BUILT = 'test/**/*.built.test.ts';

export default defineConfig(({ mode }) => ({
  test: {
    projects:
      mode === 'long'
        ? [{ test: { name: 'long', include: [LONG], testTimeout: 600_000 } }]
        : [
            {
              test: {
                name: 'source',
                include: ['test/**/*.test.ts'],
                exclude: [...configDefaults.exclude, LONG, BUILT],
              },
            },
            {
              test: {
                name: 'built',
                include: [BUILT],
                globalSetup: 'test/buildFirst.ts',
                testTimeout: 60_000,
              },
            },
          ],
  },
}));
