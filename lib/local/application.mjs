import path from 'node:path'
import { pathToFileURL } from 'node:url'
import { bundleWorker } from './build.mjs'
import { root } from './paths.mjs'
import { Supervised, processNote } from './processes.mjs'
import { SetupError, until, whyNotListening } from './run.mjs'

const HEALTHY_WITHIN_MS = 120_000
/** Falling this often in a row before it was ever healthy means it cannot start at all. */
const HOPELESS = 3

/** Ends what a killed start has left over, then makes sure of the port, before anything slow is begun. */
export async function clearTheWay({ folder, host, port }) {
  await processesOf(folder).endLeftovers()
  const reason = await whyNotListening(port, host)
  if (reason === undefined) return
  throw new SetupError(
    reason === 'EADDRINUSE'
      ? `Port ${port} is in use by another program. Free it, or choose another: PORT=${port + 1} npm start`
      : `Nothing can listen at HOST=${host}, PORT=${port} (${reason}). Put an address of this machine, such as 127.0.0.1, or 0.0.0.0 for all of them.`,
  )
}

function processesOf(folder) {
  return processNote(path.join(folder, 'processes.json'), `STEADFOLD_FOLDER=${folder}`)
}

/**
 * Starts the web server and the worker and keeps both alive. The application must be built, and its database ready.
 * `healthy` resolves once the web server answers; `stop` ends both.
 */
export async function startApplication({ folder, host, port, variables, dev = false, say }) {
  const note = processesOf(folder)
  // The account that may change the schema stays out of reach of what faces the network.
  const { DATABASE_MIGRATE_USER: _user, DATABASE_MIGRATE_PASSWORD: _password, ...inherited } = process.env
  const env = {
    ...inherited,
    ...variables,
    STEADFOLD_FOLDER: folder,
    NODE_ENV: dev ? 'development' : 'production',
  }
  let lost
  const common = { cwd: root, env, say, note }
  const web = new Supervised({
    ...common,
    env: { ...env, NODE_OPTIONS: withOwnAddress(process.env.NODE_OPTIONS) },
    name: 'web',
    command: process.execPath,
    args: [
      path.join(root, 'node_modules/next/dist/bin/next'),
      dev ? 'dev' : 'start',
      '-H',
      host,
      '-p',
      String(port),
    ],
    onFall: (falls, reason) => {
      if (falls >= HOPELESS) lost = reason
    },
  })
  let worker
  const startWorker = () => {
    worker = new Supervised({
      ...common,
      name: 'worker',
      command: process.execPath,
      args: ['--enable-source-maps', path.join(root, 'dist/worker/worker.mjs')],
    })
  }
  // In development each good bundle, the first included, starts the worker anew.
  const onRebuild = (errors) => {
    if (errors.length > 0) say('worker', `${errors[0].text}\n`)
    else if (worker) worker.restart()
    else startWorker()
  }
  const endWatch = dev ? await bundleWorker({ onRebuild }) : startWorker()
  const stop = async () => {
    await endWatch?.()
    await Promise.all([web.stop(), worker?.stop()])
  }
  const address = `http://${host === '0.0.0.0' ? '127.0.0.1' : host}:${port}`
  const healthy = async () => {
    const up = await until(async () => lost !== undefined || (await isHealthy(address)), {
      timeoutMs: HEALTHY_WITHIN_MS,
      everyMs: 150,
    })
    if (up && lost === undefined) return
    throw new SetupError(
      `The web server does not answer at ${address}${lost === undefined ? '' : ` (${lost})`}; its own words are above.`,
    )
  }
  return { address, healthy, stop }
}

/**
 * NODE_OPTIONS that put own-address.mjs before everything in the web server. Not an argument of the process: in development
 * next serves from a child of its own.
 */
export function withOwnAddress(options = '') {
  const file = pathToFileURL(path.join(root, 'lib/local/own-address.mjs'))
  return `${options} --import=${file}`.trim()
}

async function isHealthy(address) {
  try {
    const response = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(5_000) })
    await response.arrayBuffer()
    return response.ok
  } catch {
    return false
  }
}
