import { defineConfig } from 'vitest/config'

const project = (name: string, include: string[], extra: object = {}) => ({
  test: { name, root: '.', include, ...extra },
})

/** LibreOffice takes seconds a file: only tests that look at pages have it lay out their documents. */
const withoutOffice = { env: { COLDFILL_OFFICE: 'none' } }

export default defineConfig({
  test: {
    maxWorkers: 2,
    pool: 'forks',
    projects: [
      project(
        'unit',
        [
          'packages/*/src/**/*.test.ts',
          'apps/cli/src/**/*.test.ts',
          'tests/*.test.ts',
          'tests/golden/**/*.test.ts',
          'tests/language-server/**/*.test.ts',
        ],
        {
          // Generous: a machine may be busy. No test measures time by its limit.
          testTimeout: 120_000,
          hookTimeout: 120_000,
          ...withoutOffice,
        },
      ),
      project('server', ['apps/server/src/**/*.test.ts'], {
        testTimeout: 180_000,
        hookTimeout: 180_000,
        ...withoutOffice,
      }),
      project('web', ['apps/web/src/**/*.test.ts']),
      project('browser', ['tests/e2e/**/*.test.ts'], {
        // A browser on a busy machine takes more than the second that is usual for code.
        expect: { poll: { timeout: 15_000 } },
        testTimeout: 300_000,
        hookTimeout: 180_000,
        fileParallelism: false,
        ...withoutOffice,
      }),
      project('office', ['tests/office/**/*.test.ts'], {
        testTimeout: 180_000,
        hookTimeout: 120_000,
        fileParallelism: false,
      }),
    ],
  },
})
