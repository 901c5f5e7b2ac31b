import type { TestProject } from 'vitest/node'
import { makeTestDatabase } from '../../lib/local/test-database.mjs'

declare module 'vitest' {
  export interface ProvidedContext {
    databaseVariables: Record<string, string>
  }
}

/** A database of its own for this run: made, migrated and granted before, removed after. */
export default async function run(project: TestProject): Promise<() => Promise<void>> {
  const { variables, remove } = await makeTestDatabase(`steadfold_test_${process.pid}`)
  project.provide('databaseVariables', variables)
  return remove
}
