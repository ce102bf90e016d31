import { resolve } from 'node:path'
import { defineConfig } from 'vitest/config'

const root = resolve(import.meta.dirname, '..')
const shared = { resolve: { alias: { '@': root } } }

/** unit: pure and fast. reference: against what the project did not make. db: against a real MariaDB. */
export default defineConfig({
  root,
  test: {
    coverage: {
      provider: 'v8',
      include: ['lib/{access,calendar,duties,electrical,errors,homes,imports,risk}/**'],
      reporter: ['text-summary', 'json-summary'],
    },
    projects: [
      {
        ...shared,
        test: {
          name: 'unit',
          root,
          include: ['tests/unit/**/*.test.{ts,tsx}'],
          setupFiles: ['tests/unit/fail-on-console-error.ts'],
        },
      },
      { ...shared, test: { name: 'reference', root, include: ['tests/reference/**/*.test.ts'] } },
      {
        ...shared,
        test: {
          name: 'db',
          root,
          include: ['tests/db/**/*.test.ts'],
          globalSetup: ['tests/db/start-database.ts'],
          setupFiles: ['tests/db/own-database.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
          maxWorkers: 2,
        },
      },
    ],
  },
})
