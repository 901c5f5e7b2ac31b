import { existsSync } from 'node:fs'
import path from 'node:path'
import { pathToFileURL } from 'node:url'
import { closeDatabase } from '@/lib/db/connection'

/*
 * node --import ./lib/local/typescript.mjs lib/local/seed.ts reference [demo]
 * Runs seeders/NN-NAME.ts in the order given. Each exports `seed(): Promise<unknown>`, may run any number of times, and is
 * the judge of whether it may run at all. What the last one resolves with is printed as JSON on the last line.
 */
const files: Record<string, string> = { reference: 'seeders/01-reference.ts', demo: 'seeders/02-demo.ts' }

try {
  let last: unknown
  for (const name of process.argv.slice(2)) {
    const file = files[name]
    if (file === undefined)
      throw new Error(`Unknown seeder “${name}”: put ${Object.keys(files).join(' or ')}.`)
    if (!existsSync(file)) continue
    const seeder = (await import(pathToFileURL(path.resolve(file)).href)) as { seed: () => Promise<unknown> }
    last = await seeder.seed()
  }
  console.log(JSON.stringify(last ?? null))
} catch (error) {
  console.error(error)
  process.exitCode = 1
} finally {
  await closeDatabase()
}
