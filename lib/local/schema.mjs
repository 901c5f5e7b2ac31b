import path from 'node:path'
import { root } from './paths.mjs'
import { SetupError, run } from './run.mjs'

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
