import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { applyGrants, createDatabaseAndUsers, dropDatabase } from './grants.mjs'
import { query, startMariadb, stopMariadb } from './mariadb.mjs'
import { testDataDir } from './paths.mjs'
import { SetupError, processExists, until } from './run.mjs'
import { migrateUp, runTypescript } from './schema.mjs'
import { keepSecrets } from './secrets.mjs'
import { databaseVariables, migrateVariables } from './variables.mjs'

/*
 * The tests' MariaDB is one server under .data/test with a database per run. Whoever needs it first starts it; the last
 * run to end stops it, unless `npm test` started it and does so itself.
 */
const lock = path.join(testDataDir, 'server.lock')
const borrowed = path.join(testDataDir, 'server.borrowed')

/**
 * A fresh database for the run of this process: migrated, with the application's rights and, unless asked otherwise, the
 * reference rows. `remove` drops it again.
 */
export async function makeTestDatabase(name = `steadfold_test_${process.pid}`, { reference = true } = {}) {
  const secrets = keepSecrets(testDataDir)
  // The server may be stopped by another run only while no run has a database: both happen under the lock.
  const server = await exclusively(async () => {
    const running = await startMariadb(testDataDir, { forTests: true })
    if (running.started) writeFileSync(borrowed, '')
    await dropLeftovers(running)
    await dropDatabase(running, name)
    await createDatabaseAndUsers(running, name, secrets)
    return running
  })
  const variables = {
    ...databaseVariables(server, name, secrets),
    ...migrateVariables(secrets),
    APP_URL: 'http://localhost:3000',
    NEXTAUTH_SECRET: secrets.nextauthSecret,
    DATA_DIR: testDataDir,
  }
  await migrateUp(variables)
  await applyGrants(server, name)
  if (reference) await runTypescript('lib/local/seed.ts', ['reference'], variables)
  const remove = () =>
    exclusively(async () => {
      await dropDatabase(server, name)
      if (!existsSync(borrowed) || (await databasesOfRuns(server)).length > 0) return
      await stopMariadb(testDataDir)
      rmSync(borrowed, { force: true })
    })
  return { server, secrets, variables, remove }
}

/** Starts the tests' server for a whole `npm test`; the returned function stops it. */
export async function holdTestServer() {
  const server = await exclusively(async () => {
    const running = await startMariadb(testDataDir, { forTests: true })
    rmSync(borrowed, { force: true })
    return running
  })
  return { server, stop: () => exclusively(() => stopMariadb(testDataDir)) }
}

async function databasesOfRuns(server) {
  const rows = await query(
    server,
    String.raw`SELECT schema_name FROM information_schema.schemata WHERE schema_name LIKE 'steadfold\_test\_%'`,
  )
  return rows.flat()
}

/** Databases of runs that were killed: their names end in the id of a process that is gone. */
async function dropLeftovers(server) {
  for (const name of await databasesOfRuns(server)) {
    if (!processExists(Number(name.split('_')[2]))) await dropDatabase(server, name)
  }
}

/** One run at a time starts or stops the server. */
async function exclusively(work) {
  mkdirSync(testDataDir, { recursive: true })
  if (!(await until(takeLock, { timeoutMs: 120_000 })))
    throw new SetupError(`${lock} is held by another test run.`)
  try {
    return await work()
  } finally {
    rmSync(lock, { force: true })
  }
}

function takeLock() {
  try {
    writeFileSync(lock, String(process.pid), { flag: 'wx' })
    return true
  } catch {
    // A killed run cannot give its lock back.
    const holder = existsSync(lock) ? Number(readFileSync(lock, 'utf8')) : 0
    if (holder > 0 && !processExists(holder)) rmSync(lock, { force: true })
    return false
  }
}
