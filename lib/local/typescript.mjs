import { register } from 'node:module'
import 'tsx'

/*
 * node --import ./lib/local/typescript.mjs some/file.ts
 * Runs the application's TypeScript outside Next: tsx compiles it, and `server-only`, which throws outside Next, becomes
 * an empty module. (The react-server condition would do the latter too, but hands out another React.)
 */
const emptyServerOnly = `
export async function resolve(specifier, context, next) {
  return specifier === 'server-only' ? { url: 'data:text/javascript,', shortCircuit: true } : next(specifier, context)
}`

register(`data:text/javascript,${encodeURIComponent(emptyServerOnly)}`)
