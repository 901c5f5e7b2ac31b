import type { Sequelize } from 'sequelize'
import { afterAll, beforeEach } from 'vitest'
import { createDatabase } from '@/lib/db/connection'
import { env } from '@/lib/env'
import { models } from '@/models'

/*
 * Tests speak to the database as the application does, with its rights and no more. Emptying tables is beyond those
 * rights, so it goes through the account of the migrations.
 */

/** Rows every installation starts with (seeders/01-reference.ts) stay; everything else goes. */
const KEEPS: Record<string, string> = {
  species_profiles: 'created_by IS NULL',
  crate_models: "name LIKE 'Corran %'",
}

/** Begins each test of a file, or of a describe block, with no rows but the reference ones. */
export function withEmptyTables(): void {
  beforeEach(emptyTables)
}

/** Removes all rows but the reference ones. Numbers go on counting, so no test can rely on a row being number 1. */
export async function emptyTables(): Promise<void> {
  await asOwner(async (owner) => {
    await owner.transaction(async (transaction) => {
      await owner.query('SET SESSION foreign_key_checks = 0', { transaction })
      for (const model of Object.values(models)) {
        const table = model.getTableName() as string
        const keep = KEEPS[table]
        await owner.query(`DELETE FROM ${table}${keep === undefined ? '' : ` WHERE NOT (${keep})`}`, {
          transaction,
        })
      }
    })
  })
}

let owner: Sequelize | undefined

afterAll(async () => {
  await owner?.close()
  owner = undefined
})

/** Runs SQL as the owner of the schema: to look behind the application's rights, or to break something on purpose. */
export async function asOwner<T>(work: (owner: Sequelize) => Promise<T>): Promise<T> {
  owner ??= createDatabase(() => ({
    ...env().database,
    user: process.env.DATABASE_MIGRATE_USER ?? '',
    password: process.env.DATABASE_MIGRATE_PASSWORD ?? '',
  }))
  return work(owner)
}
