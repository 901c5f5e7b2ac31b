import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '..')

/** Folders whose tests need the real MariaDB; elsewhere a file says so by its name: something.db.test.ts. */
const onDatabase = ['tests/{db,models,domain,auth,workers}/**/*.test.{ts,tsx}', 'tests/**/*.db.test.{ts,tsx}']

const shared = {
  root,
  resolve: {
    alias: {
      '@': root,
      'server-only': path.join(root, 'tests/support/server-only.ts'),
    },
  },
}

export default defineConfig({
  ...shared,
  test: {
    projects: [
      {
        ...shared,
        test: {
          name: 'unit',
          environment: 'node',
          env: { TZ: 'UTC' },
          include: ['tests/**/*.test.{ts,tsx}'],
          exclude: [...onDatabase, 'tests/e2e/**'],
        },
      },
      {
        ...shared,
        test: {
          name: 'db',
          environment: 'node',
          env: { TZ: 'UTC' },
          include: onDatabase,
          exclude: ['tests/e2e/**'],
          globalSetup: ['tests/support/db-run.ts'],
          setupFiles: ['tests/support/db-address.ts'],
          // One database, one file at a time: a test may look at all rows of a table.
          fileParallelism: false,
          testTimeout: 20_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
})
