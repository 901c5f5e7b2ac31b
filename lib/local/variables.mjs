import { APP_USER, MIGRATE_USER } from './grants.mjs'

/** The variables of lib/env.ts for a process that uses this machine's database. */
export function databaseVariables(server, database, secrets) {
  return {
    DATABASE_HOST: '127.0.0.1',
    DATABASE_PORT: String(server.port),
    DATABASE_NAME: database,
    DATABASE_USER: APP_USER,
    DATABASE_PASSWORD: secrets.databaseAppPassword,
  }
}

/** Added for migrations alone: the account that may change the schema is not given to the application. */
export function migrateVariables(secrets) {
  return { DATABASE_MIGRATE_USER: MIGRATE_USER, DATABASE_MIGRATE_PASSWORD: secrets.databaseMigratePassword }
}
