import './env-file.mjs'
import { existsSync } from 'node:fs'
import path from 'node:path'
import { databaseFiles, dataDir, root } from './paths.mjs'
import { startMariadb } from './mariadb.mjs'
import { SetupError, failAndExit, run } from './run.mjs'
import { keepSecrets } from './secrets.mjs'
import { applicationVariables, databaseVariables, migrateVariables } from './variables.mjs'

/*
 * node lib/local/with-database.mjs FILE.ts ARGUMENTS
 * Runs one of our TypeScript files with the configuration that `npm start` works out, beside a running Steadfold.
 */
const [file, ...args] = process.argv.slice(2)

work().catch(failAndExit)

async function work() {
  const command = ['--import', path.join(root, 'lib/local/typescript.mjs'), path.join(root, file), ...args]
  const env = { ...process.env, TZ: 'UTC', ...(await variables()) }
  process.exitCode = (await run(process.execPath, command, { cwd: root, env, show: true })).code
}

async function variables() {
  const secrets = keepSecrets(dataDir)
  const rest = applicationVariables({ folder: dataDir, port: Number(process.env.PORT || 3000), secrets })
  if (process.env.DATABASE_USER) return rest
  if (!existsSync(databaseFiles(dataDir).socket))
    throw new SetupError('Steadfold does not run: start it first, with npm start.')
  const server = await startMariadb(dataDir)
  return {
    ...rest,
    ...databaseVariables(server, process.env.DATABASE_NAME || 'steadfold', secrets),
    ...migrateVariables(secrets),
  }
}
