import { existsSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

/*
 * Imported first, for its effect: puts what .env holds into the environment before any other module looks at it (paths.mjs
 * works DATA_DIR out as it is loaded). What is set already wins. An older Node.js has no such function, and is refused later.
 */
const file = fileURLToPath(new URL('../../.env', import.meta.url))
if (existsSync(file)) process.loadEnvFile?.(file)
