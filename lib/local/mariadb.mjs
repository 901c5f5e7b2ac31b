import { spawn } from 'node:child_process'
import {
  closeSync,
  existsSync,
  openSync,
  readFileSync,
  readdirSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs'
import { userInfo } from 'node:os'
import path from 'node:path'
import { databaseFiles } from './paths.mjs'
import {
  SetupError,
  endWithUs,
  findProgram,
  freePort,
  portIsFree,
  processExists,
  run,
  until,
  writableFolder,
} from './run.mjs'

const USUAL_PORT = 33_306
/** SKIP LOCKED came with 10.6. */
const OLDEST = [10, 6]
const START_MS = 90_000
const STOP_MS = 45_000

/**
 * Starts the project's own MariaDB on loopback, unless it runs already; a first start makes the data folder.
 * `port` undefined means: the one of last time, else the usual one, else any free one. `forTests` trades safety in a
 * power cut for speed.
 * Resolves with how to reach it and whether this call started it.
 *
 * @param {string} folder
 * @param {{ port?: number | undefined, forTests?: boolean }} [options]
 */
export async function startMariadb(folder, { port, forTests = false } = {}) {
  const files = databaseFiles(folder)
  const programs = await findPrograms()
  writableFolder(folder)
  if (await answers(files, programs)) return { ...(await describe(files)), files, programs, started: false }
  await clearStaleProcess(files, programs)
  await initialise(files, programs)
  const chosen = await choosePort(files, port)
  await launch(files, programs, chosen, forTests)
  writeFileSync(files.port, `${chosen}\n`)
  return { port: chosen, files, programs, started: true }
}

/** Shuts the server down cleanly and waits for it; nothing to do where it does not run. */
export async function stopMariadb(folder) {
  const files = databaseFiles(folder)
  const programs = await findPrograms()
  const pid = readNumber(files.pid)
  if (!(await answers(files, programs))) return false
  await run(programs.admin, [
    '--no-defaults',
    `--socket=${files.socket}`,
    `--user=${userInfo().username}`,
    'shutdown',
  ])
  const gone = await until(async () => !existsSync(files.pid) && !(await answers(files, programs)), {
    timeoutMs: STOP_MS,
  })
  if (!gone) throw new SetupError(`MariaDB (process ${pid}) does not stop. See ${files.log}.`)
  return true
}

/**
 * Runs SQL as the account of the person who owns the data folder, over the socket. Returns rows as arrays of strings.
 *
 * @returns {Promise<string[][]>}
 */
export async function query(server, sql) {
  const { code, stdout, stderr } = await run(
    server.programs.client,
    [
      '--no-defaults',
      `--socket=${server.files.socket}`,
      `--user=${userInfo().username}`,
      '--default-character-set=utf8mb4',
      '--batch',
      '--skip-column-names',
    ],
    { input: sql },
  )
  if (code !== 0) throw new SetupError(`The database refused a set-up step: ${stderr.trim()}`)
  return stdout
    .split('\n')
    .filter((line) => line !== '')
    .map((line) => line.split('\t'))
}

async function findPrograms() {
  const programs = {
    server: findProgram('mariadbd', 'mysqld'),
    install: findProgram('mariadb-install-db'),
    admin: findProgram('mariadb-admin'),
    client: findProgram('mariadb'),
  }
  const missing = Object.entries(programs).find(([, file]) => file === undefined)
  if (missing)
    throw new SetupError(
      `MariaDB is not installed (no ${missing[0]} program). On Debian or Ubuntu: sudo apt-get install mariadb-server`,
    )
  const { stdout } = await run(programs.server, ['--no-defaults', '--version'])
  const version = /Ver (\d+)\.(\d+)\.\d+-MariaDB/.exec(stdout)
  const [major, minor] = [Number(version?.[1]), Number(version?.[2])]
  if (!version || major < OLDEST[0] || (major === OLDEST[0] && minor < OLDEST[1])) {
    throw new SetupError(
      `MariaDB ${OLDEST.join('.')} or newer is needed; ${programs.server} says: ${stdout.trim()}`,
    )
  }
  return programs
}

/** The only sure sign of a running server: just after a crash its process id may still seem alive. */
async function answers(files, programs) {
  if (!existsSync(files.socket)) return false
  const { code } = await run(programs.admin, [
    '--no-defaults',
    `--socket=${files.socket}`,
    `--user=${userInfo().username}`,
    '--connect-timeout=3',
    'ping',
  ])
  return code === 0
}

async function describe(files) {
  return { port: readNumber(files.port) }
}

async function clearStaleProcess(files, programs) {
  const pid = readNumber(files.pid)
  if (pid !== undefined && processExists(pid) && isOurServer(pid, files)) {
    // Perhaps it is starting or recovering in another terminal: give it a moment before calling it stuck.
    if (await until(() => answers(files, programs), { timeoutMs: 20_000, everyMs: 250 })) return
    if (processExists(pid) && isOurServer(pid, files))
      throw new SetupError(
        `A MariaDB (process ${pid}) holds ${files.folder} and does not answer. Stop that process and start again.`,
      )
  }
  rmSync(files.pid, { force: true })
  rmSync(files.socket, { force: true })
}

function isOurServer(pid, files) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0').includes(`--datadir=${files.folder}`)
  } catch {
    return false
  }
}

/** Built beside its place and moved there when whole, so that an interrupted first start leaves nothing half-made. */
async function initialise(files, programs) {
  if (existsSync(files.folder) && readdirSync(files.folder).length > 0) {
    const whole =
      existsSync(path.join(files.folder, 'ibdata1')) && existsSync(path.join(files.folder, 'mysql'))
    if (!whole)
      throw new SetupError(
        `${files.folder} is only half a database: system files are missing. Move it away (it may hold data) or delete it, then start again.`,
      )
    if (process.getuid?.() !== 0 && statSync(files.folder).uid !== process.getuid?.()) {
      throw new SetupError(
        `${files.folder} belongs to another user. Start as that user, or set DATA_DIR to another folder.`,
      )
    }
    return
  }
  const fresh = `${files.folder}.new`
  rmSync(fresh, { recursive: true, force: true })
  const { code, stdout, stderr } = await run(programs.install, [
    '--no-defaults',
    ...asUser(),
    `--datadir=${fresh}`,
    // Administration is for the owner of the folder, over the socket; there is no password to lose and no way in by network.
    '--auth-root-authentication-method=socket',
    `--auth-root-socket-user=${userInfo().username}`,
    '--skip-test-db',
    '--skip-name-resolve',
  ])
  if (code !== 0)
    throw new SetupError(
      `The database folder could not be made:\n${(stdout + stderr).trim().split('\n').slice(-12).join('\n')}`,
    )
  rmSync(files.folder, { recursive: true, force: true })
  renameSync(fresh, files.folder)
}

async function choosePort(files, port) {
  if (port !== undefined) {
    if (await portIsFree(port)) return port
    throw new SetupError(
      `Port ${port} (DATABASE_PORT) is in use by another program. Free it or choose another.`,
    )
  }
  return freePort(readNumber(files.port) ?? USUAL_PORT)
}

async function launch(files, programs, port, forTests) {
  const log = openSync(files.log, 'a')
  const from = statSync(files.log).size
  const child = spawn(
    programs.server,
    [
      '--no-defaults',
      ...asUser(),
      `--datadir=${files.folder}`,
      `--socket=${files.socket}`,
      `--pid-file=${files.pid}`,
      '--bind-address=127.0.0.1',
      `--port=${port}`,
      '--skip-name-resolve',
      '--character-set-server=utf8mb4',
      '--collation-server=utf8mb4_unicode_ci',
      '--default-time-zone=+00:00',
      '--transaction-isolation=READ-COMMITTED',
      '--max-allowed-packet=64M',
      '--innodb-buffer-pool-size=256M',
      ...(forTests ? ['--innodb-flush-log-at-trx-commit=0'] : []),
    ],
    // Its own session: Ctrl-C reaches the start script alone, which then shuts the server down in order.
    { detached: true, stdio: ['ignore', log, log], env: { ...process.env, TZ: 'UTC' } },
  )
  closeSync(log)
  const letLive = endWithUs(child)
  let ended
  child.once('error', (error) => (ended = error.message))
  child.once('exit', (code) => (ended ??= `exit code ${code}`))
  const up = await until(async () => ended !== undefined || (await answers(files, programs)), {
    timeoutMs: START_MS,
  })
  if (ended !== undefined || !up)
    throw new SetupError(
      `MariaDB did not start (${ended ?? 'no answer'}).\n${lastErrors(files.log, from)}\nIf its files are damaged, move ${files.folder} away (it may hold data) and start again: a new database is made.`,
    )
  letLive()
  child.unref()
}

function lastErrors(log, from) {
  const lines = readFileSync(log).subarray(from).toString('utf8').split('\n')
  const errors = lines.filter((line) => line.includes('[ERROR]'))
  return [...(errors.length > 0 ? errors : lines).slice(-6), `The whole log: ${log}`].join('\n')
}

function asUser() {
  return process.getuid?.() === 0 ? ['--user=root'] : []
}

function readNumber(file) {
  try {
    const number = Number(readFileSync(file, 'utf8').trim())
    return Number.isInteger(number) && number > 0 ? number : undefined
  } catch {
    return undefined
  }
}
