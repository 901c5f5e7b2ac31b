import { existsSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { root } from './paths.mjs'
import { SetupError, findProgram, run } from './run.mjs'

/** Programs we call, and the Debian package each comes in. */
export const FOR_START = {
  mariadbd: 'mariadb-server',
  'mariadb-install-db': 'mariadb-server',
  mariadb: 'mariadb-client',
}
export const FOR_TESTS = {
  ...FOR_START,
  chromium: 'chromium',
  pdfsig: 'poppler-utils',
  pdftotext: 'poppler-utils',
  pdftoppm: 'poppler-utils',
  certutil: 'libnss3-tools',
}

/** Says at once what would otherwise fail later in a riddle. */
export function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number)
  if (major === 20 && minor >= 12) return
  throw new SetupError(`Node.js 20 (20.12 or newer) is needed; this is ${process.versions.node}.`)
}

/** Installs what is missing with apt-get, as root or through sudo; elsewhere says what to install. */
export async function ensurePrograms(programs, say) {
  const missing = Object.keys(programs).filter((program) => findProgram(program) === undefined)
  if (missing.length === 0) return
  const packages = [...new Set(missing.map((program) => programs[program]))]
  const byHand = `Install these packages, then start again: ${packages.join(' ')} (programs missing: ${missing.join(', ')}).`
  if (findProgram('apt-get') === undefined) throw new SetupError(`This machine has no apt-get. ${byHand}`)
  const asRoot = process.getuid?.() === 0 ? [] : [findProgram('sudo')]
  if (asRoot.includes(undefined)) throw new SetupError(`Installing needs root or sudo. ${byHand}`)

  say(`Installing ${packages.join(', ')} …`)
  for (const args of [['update'], ['install', '-y', '--no-install-recommends', ...packages]]) {
    const [command, ...rest] = [...asRoot, 'env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get', '-q', ...args]
    const { code, stdout, stderr } = await run(command, rest)
    if (code !== 0)
      throw new SetupError(
        `apt-get ${args[0]} failed:\n${(stderr || stdout).trim().split('\n').slice(-8).join('\n')}\n${byHand}`,
      )
  }
  const still = missing.filter((program) => findProgram(program) === undefined)
  if (still.length > 0) throw new SetupError(`Still missing after the installation: ${still.join(', ')}.`)
}

/** Runs `npm ci` unless node_modules already holds what the lock file asks for. */
export async function ensureNodePackages(say) {
  if (nodePackagesMatchLock()) return
  say('Installing the npm packages …')
  // Under `npm start` the very same npm; by hand the one on PATH.
  const [command, ...first] = process.env.npm_execpath
    ? [process.execPath, process.env.npm_execpath]
    : ['npm']
  const { code } = await run(command, [...first, 'ci', '--no-audit', '--no-fund', '--loglevel=error'], {
    cwd: root,
    show: true,
  })
  if (code !== 0) throw new SetupError('npm ci failed; its own words are above.')
}

/** npm notes what it has installed in node_modules/.package-lock.json, at the very end: an interrupted run leaves none. */
function nodePackagesMatchLock() {
  const noteFile = path.join(root, 'node_modules/.package-lock.json')
  if (!existsSync(noteFile)) return false
  const wanted = JSON.parse(readFileSync(path.join(root, 'package-lock.json'), 'utf8')).packages
  const present = JSON.parse(readFileSync(noteFile, 'utf8')).packages
  return Object.entries(wanted).every(([place, { version, optional, link }]) => {
    if (place === '' || link) return true
    const found = present[place]
    // Optional packages for other machines are rightly absent.
    return found === undefined ? optional === true : found.version === version
  })
}
