import { randomBytes } from 'node:crypto'
import { chmodSync, existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { SetupError } from './run.mjs'

const NAMES = ['databaseMigratePassword', 'databaseAppPassword', 'nextauthSecret']

/**
 * The passwords of this installation, made at the first start and kept in secrets.json, readable by its owner alone.
 * Losing the file is harmless for the database (the accounts get new passwords) but ends every sign-in.
 */
export function keepSecrets(folder) {
  const file = path.join(folder, 'secrets.json')
  mkdirSync(folder, { recursive: true })
  const known = existsSync(file) ? readSecrets(file) : {}
  const missing = NAMES.filter((name) => typeof known[name] !== 'string' || known[name].length < 32)
  if (missing.length === 0) return known
  const all = {
    ...known,
    ...Object.fromEntries(missing.map((name) => [name, randomBytes(33).toString('base64url')])),
  }
  // Written whole or not at all: a half-written file would lock us out of our own database.
  writeFileSync(`${file}.new`, `${JSON.stringify(all, null, 2)}\n`, { mode: 0o600 })
  chmodSync(`${file}.new`, 0o600)
  renameSync(`${file}.new`, file)
  return all
}

function readSecrets(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'))
  } catch (error) {
    throw new SetupError(
      `${file} cannot be read (${error.message}). Delete it to have new secrets made; everybody then signs in again.`,
    )
  }
}
