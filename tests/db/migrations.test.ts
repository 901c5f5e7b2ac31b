import { readdirSync } from 'node:fs'
import { QueryTypes } from 'sequelize'
import type { Sequelize } from 'sequelize'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { createDatabase } from '@/lib/db/connection'
import { migrator } from '@/lib/db/migrate'
import { env } from '@/lib/env'
import { makeTestDatabase } from '@/lib/local/test-database.mjs'

let owner: Sequelize
let remove: () => Promise<void>

beforeAll(async () => {
  const made = await makeTestDatabase(`steadfold_test_${process.pid}_migrations`, { reference: false })
  remove = made.remove
  owner = createDatabase(() => ({
    ...env().database,
    name: made.variables.DATABASE_NAME,
    user: made.variables.DATABASE_MIGRATE_USER,
    password: made.variables.DATABASE_MIGRATE_PASSWORD,
  }))
})

afterAll(async () => {
  await owner.close()
  await remove()
})

test('every step back and forth again gives the same schema, step by step', async () => {
  const umzug = migrator(owner)
  const steps = (await umzug.executed()).map(({ name }) => name)
  expect(steps).toEqual(
    readdirSync('migrations')
      .map((file) => file.replace(/\.ts$/, ''))
      .sort(),
  )

  const after = new Map<string, Record<string, string>>()
  for (const name of [...steps].reverse()) {
    after.set(name, await dump())
    await umzug.down({ migrations: [name] })
    expect(await dump(), `${name} down`).not.toEqual(after.get(name))
  }
  expect(Object.keys(await dump())).toEqual(['schema_migrations'])

  for (const name of steps) {
    await umzug.up({ migrations: [name] })
    expect(await dump(), `${name} up again`).toEqual(after.get(name))
  }
}, 120_000)

/** Each table as the server itself spells it out. */
async function dump(): Promise<Record<string, string>> {
  const tables = await owner.query<{ name: string }>(
    'SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() ORDER BY table_name',
    { type: QueryTypes.SELECT },
  )
  const dumped: Record<string, string> = {}
  for (const { name } of tables) {
    const [row] = await owner.query<{ 'Create Table': string }>(`SHOW CREATE TABLE ${name}`, {
      type: QueryTypes.SELECT,
    })
    dumped[name] = String(row?.['Create Table']).replace(/ AUTO_INCREMENT=\d+/, '')
  }
  return dumped
}
