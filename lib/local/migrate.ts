import { createDatabase } from '@/lib/db/connection'
import { migrator } from '@/lib/db/migrate'
import { env } from '@/lib/env'

/*
 * node --import ./lib/local/typescript.mjs lib/local/migrate.ts up | down [--to NAME | 0] | pending
 * Connects as the account that may change the schema, where one is configured.
 */
const sequelize = createDatabase(() => ({
  ...env().database,
  ...(process.env.DATABASE_MIGRATE_USER
    ? { user: process.env.DATABASE_MIGRATE_USER, password: process.env.DATABASE_MIGRATE_PASSWORD ?? '' }
    : {}),
}))

const [direction = 'up', flag, target] = process.argv.slice(2)
const umzug = migrator(sequelize)
const to = flag === '--to' ? target : undefined

try {
  if (direction === 'up') report('applied', await umzug.up(to === undefined ? undefined : { to }))
  else if (direction === 'down')
    report('taken back', await umzug.down(to === undefined ? undefined : { to: to === '0' ? 0 : to }))
  else if (direction === 'pending') report('pending', await umzug.pending())
  else throw new Error(`Unknown direction “${direction}”: put up, down or pending.`)
} catch (error) {
  console.error(error instanceof Error ? `${error.message}${causeOf(error)}` : error)
  process.exitCode = 1
} finally {
  await sequelize.close()
}

function report(what: string, steps: { name: string }[]) {
  console.log(
    steps.length === 0
      ? `No migration ${what}.`
      : `${steps.length} ${what}: ${steps.map((step) => step.name).join(', ')}`,
  )
}

function causeOf(error: Error) {
  return error.cause instanceof Error ? `: ${error.cause.message}` : ''
}
