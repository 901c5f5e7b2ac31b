import path from 'node:path'
import { root } from './paths.mjs'
import { SetupError, run } from './run.mjs'
import { applicationVariables, databaseVariables } from './variables.mjs'

/**
 * Checks the configuration as the application will read it, in the same words and before anything slow; throws what is
 * wrong. Resolves with whether the demo is wanted: never in a database of somebody else's, where its accounts, whose
 * passwords everybody can read, would stand beside real ones.
 */
export async function checkSettings({ folder, port, secrets, ownDatabase }, given = process.env) {
  const variables = {
    ...applicationVariables({ folder, port, secrets }, given),
    NODE_ENV: 'production',
    // Follows APP_URL where it is not given: what is wrong is named once.
    NEXTAUTH_URL: given.NEXTAUTH_URL || '',
    // The real port is known once the server runs, and no secret of ours can be wrong.
    ...(ownDatabase &&
      databaseVariables({ port: given.DATABASE_PORT || 3306 }, given.DATABASE_NAME || '', secrets)),
  }
  const { code, stdout, stderr } = await run(
    process.execPath,
    ['--import', path.join(root, 'lib/local/typescript.mjs'), path.join(root, 'lib/local/settings.ts')],
    { cwd: root, env: { ...given, ...variables } },
  )
  if (code !== 0) throw new SetupError((stderr || stdout).trim())
  const { demo } = JSON.parse(stdout)
  if (ownDatabase || !demo) return { demo }
  if (!given.DEMO) return { demo: false }
  throw new SetupError(
    'DEMO is yes, and DATABASE_USER names a database of yours: the demo is put only into the one npm start keeps itself. Leave DEMO out, or put no.',
  )
}
