import path from 'node:path'
import { checkNode, FOR_TESTS, ensureNodePackages, ensurePrograms } from './packages.mjs'
import { root } from './paths.mjs'
import { failAndExit, run } from './run.mjs'
import { makeTestDatabase } from './test-database.mjs'

/*
 * npm run bench: how fast the engine, an assessment and a release are on this machine. A release is a real one, so it
 * runs on a database of its own.
 */
measure().catch(failAndExit)

async function measure() {
  checkNode()
  await ensurePrograms(FOR_TESTS, console.log)
  await ensureNodePackages(console.log)
  const { variables, remove } = await makeTestDatabase()
  try {
    const args = [
      '--import',
      path.join(root, 'lib/local/typescript.mjs'),
      path.join(root, 'lib/local/bench.ts'),
    ]
    const env = { ...process.env, ...variables, NODE_ENV: 'production', TZ: 'UTC' }
    process.exitCode = (await run(process.execPath, args, { cwd: root, env, show: true })).code
  } finally {
    await remove()
  }
}
