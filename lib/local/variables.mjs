import { APP_USER, MIGRATE_USER } from './grants.mjs'

/*
 * What lib/env.ts reads, for processes on this machine. A variable that is set already, in the environment or in .env,
 * wins over what is worked out here.
 */

/** How the application reaches this machine's database. */
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

/** The rest of the configuration; `given` is what was set by hand. */
export function applicationVariables({ folder, port, secrets, smtpUrl }, given = process.env) {
  const appUrl = given.APP_URL || `http://localhost:${port}`
  return {
    TZ: 'UTC',
    PORT: String(port),
    APP_URL: appUrl,
    NEXTAUTH_URL: given.NEXTAUTH_URL || appUrl,
    NEXTAUTH_SECRET: given.NEXTAUTH_SECRET || secrets.nextauthSecret,
    SMTP_URL: given.SMTP_URL || smtpUrl || '',
    DATA_DIR: folder,
    NEXT_TELEMETRY_DISABLED: '1',
  }
}
