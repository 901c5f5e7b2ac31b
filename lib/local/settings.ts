import { readEnv } from '@/lib/env'
import { checkOwnKey } from '@/lib/signing'

/*
 * node --import ./lib/local/typescript.mjs lib/local/settings.ts
 * Reads the whole configuration as the application will, before anything slow is begun, and prints as JSON what the start
 * itself must know.
 */
try {
  const { demo } = readEnv(process.env)
  await checkOwnKey(new Date())
  console.log(JSON.stringify({ demo }))
} catch (error) {
  console.error(error instanceof Error ? error.message : error)
  process.exitCode = 1
}
