import { createHash } from 'node:crypto'
import { existsSync, readFileSync, readdirSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { applyGrants, createDatabaseAndUsers } from './grants.mjs'
import { query } from './mariadb.mjs'
import { root } from './paths.mjs'
import { SetupError, run } from './run.mjs'
import { migrateVariables } from './variables.mjs'

/** Runs one of our TypeScript files to its end with the given variables; throws what it said where it fails. */
export async function runTypescript(file, args, variables) {
  const { code, stdout, stderr } = await run(
    process.execPath,
    ['--import', path.join(root, 'lib/local/typescript.mjs'), path.join(root, file), ...args],
    { cwd: root, env: { ...process.env, TZ: 'UTC', ...variables } },
  )
  if (code !== 0) throw new SetupError(`${file} ${args.join(' ')} failed:\n${(stderr || stdout).trim()}`)
  return stdout.trim()
}

/** Brings the schema up to date. Resolves with what was done, in words. */
export function migrateUp(variables) {
  return runTypescript('lib/local/migrate.ts', ['up'], variables)
}

/**
 * Makes a database of this machine ready: accounts, schema, rights, reference rows, and the demo where nobody has an
 * account yet. What is ready already is told by a glance and skipped. `signIns` is what the demo printed, if it ran now or
 * earlier; `empty` says that nobody has an account.
 */
export async function prepareDatabase({ server, database, secrets, variables, folder, demo, say }) {
  await createDatabaseAndUsers(server, database, secrets)
  if (!(await migrationsAreApplied(server, database))) {
    say('Bringing the database schema up to date …')
    await migrateUp({ ...variables, ...migrateVariables(secrets) })
  }
  await applyGrants(server, database)
  return seed({ server, database, variables, folder, demo, say })
}

async function migrationsAreApplied(server, database) {
  const files = readdirSync(path.join(root, 'migrations')).map((file) => file.replace(/\.ts$/, ''))
  const table = await query(
    server,
    `SELECT 1 FROM information_schema.tables WHERE table_schema = '${database}' AND table_name = 'schema_migrations'`,
  )
  if (table.length === 0) return false
  const applied = new Set((await query(server, `SELECT name FROM \`${database}\`.schema_migrations`)).flat())
  return files.every((file) => applied.has(file))
}

async function seed({ server, database, variables, folder, demo, say }) {
  const noteFile = path.join(folder, `seeded-${database}.json`)
  const note = existsSync(noteFile) ? JSON.parse(readFileSync(noteFile, 'utf8')) : {}
  const [counts] = await query(
    server,
    `SELECT (SELECT COUNT(*) FROM \`${database}\`.users), (SELECT COUNT(*) FROM \`${database}\`.species_profiles)`,
  )
  const [users, species] = counts.map(Number)
  const sources = hashOf(['seeders/01-reference.ts', 'lib/species'])
  const wantsReference = species === 0 || note.reference !== sources
  // Into an empty installation only, or where an earlier attempt broke off: the demo may be put in again and again.
  const wantsDemo = demo && (users === 0 || note.demoBegun === true)
  if (wantsReference || wantsDemo) {
    say(wantsDemo ? 'Filling in the catalogues and the demo …' : 'Filling in the catalogues …')
    if (wantsDemo) writeFileSync(noteFile, JSON.stringify({ ...note, demoBegun: true }))
    const printed = await runTypescript(
      'lib/local/seed.ts',
      wantsDemo ? ['reference', 'demo'] : ['reference'],
      variables,
    )
    const fresh = { reference: sources, demo: wantsDemo ? JSON.parse(printed.split('\n').at(-1)) : note.demo }
    writeFileSync(noteFile, JSON.stringify(fresh))
    return { signIns: fresh.demo ?? null, empty: users === 0 && !wantsDemo }
  }
  return { signIns: users === 0 ? null : (note.demo ?? null), empty: users === 0 }
}

function hashOf(places) {
  const hash = createHash('sha256')
  for (const place of places) {
    const full = path.join(root, place)
    if (!existsSync(full)) continue
    const files = place.endsWith('.ts')
      ? [full]
      : readdirSync(full, { recursive: true }).map((file) => path.join(full, file))
    for (const file of files.filter((name) => name.endsWith('.ts')).sort()) hash.update(readFileSync(file))
  }
  return hash.digest('hex')
}
