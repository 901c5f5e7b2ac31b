import { spawn } from 'node:child_process'
import { accessSync, constants, mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:net'
import path from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'

/** A message for the person at the terminal; printed without a stack. */
export class SetupError extends Error {
  constructor(message) {
    super(message)
    this.name = 'SetupError'
  }
}

/** Prints what went wrong and leaves with exit code 1. */
export function failAndExit(error) {
  console.error(error?.name === 'SetupError' ? `\n${error.message}` : error)
  process.exit(1)
}

const children = new Set()
process.on('exit', () => {
  for (const child of children) child.kill('SIGTERM')
})

/** Ends this child with our own process, if it has not ended before; the returned function lets it live on. */
export function endWithUs(child) {
  children.add(child)
  child.once('exit', () => children.delete(child))
  return () => children.delete(child)
}

/**
 * Under npm a signal to npm ends npm and its shell, but not us: when the parent is gone, so is the wish that we run.
 * Does nothing for a process that was started directly.
 */
export function whenNpmIsGone(act) {
  if (!process.env.npm_lifecycle_event) return
  const parent = process.ppid
  const watch = setInterval(() => {
    if (process.ppid === parent) return
    clearInterval(watch)
    act()
  }, 500)
  watch.unref()
}

/** The port a variable names, or the one given for it; says what to put where it is no port. */
export function portFrom(name, otherwise) {
  const given = process.env[name]
  const port = given ? Number(given) : otherwise
  if (Number.isInteger(port) && port >= 1 && port <= 65535) return port
  throw new SetupError(
    `${name} is "${given}": put a whole number from 1 to 65535, such as ${name}=${otherwise}.`,
  )
}

/** Makes a folder if need be and proves that it can be written; says what to do where it cannot. */
export function writableFolder(folder) {
  try {
    mkdirSync(folder, { recursive: true, mode: 0o750 })
    const probe = path.join(folder, '.writable')
    writeFileSync(probe, '')
    rmSync(probe)
  } catch (error) {
    throw new SetupError(
      `The data folder ${folder} cannot be written (${error.code}). Give this user the right to it, or set DATA_DIR to another folder.`,
    )
  }
}

/**
 * Runs a program to its end. Resolves with its exit code and what it printed; with `show` the output goes straight to the
 * terminal instead. Rejects only where the program cannot be started.
 */
export function run(command, args, { input, show = false, ...options } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      ...options,
      stdio: [input === undefined ? 'ignore' : 'pipe', show ? 'inherit' : 'pipe', show ? 'inherit' : 'pipe'],
    })
    endWithUs(child)
    let stdout = ''
    let stderr = ''
    child.stdout?.setEncoding('utf8').on('data', (part) => (stdout += part))
    child.stderr?.setEncoding('utf8').on('data', (part) => (stderr += part))
    child.on('error', reject)
    child.on('close', (code, signal) => resolve({ code: code ?? 1, signal, stdout, stderr }))
    child.stdin?.end(input)
  })
}

/** The full path of a program, looked for on PATH and where Debian keeps programs for administrators; undefined if absent. */
export function findProgram(...names) {
  const folders = [
    ...(process.env.PATH ?? '').split(path.delimiter),
    '/usr/sbin',
    '/usr/local/sbin',
    '/usr/bin',
    '/usr/libexec',
  ]
  for (const name of names) {
    for (const folder of folders) {
      const file = path.join(folder, name)
      try {
        accessSync(file, constants.X_OK)
        return file
      } catch {
        // Not here: look on.
      }
    }
  }
  return undefined
}

/** True where nothing listens on the loopback port. */
export async function portIsFree(port, host = '127.0.0.1') {
  return (await whyNotListening(port, host)) === undefined
}

/** The system's code (EADDRINUSE, EACCES, …) where one cannot listen there; undefined where one can. */
export function whyNotListening(port, host) {
  const probe = createServer()
  return new Promise((resolve) => {
    probe.once('error', (error) => resolve(error.code))
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(undefined)))
  })
}

/** The wished port if free, else any free one. */
export async function freePort(wished) {
  if (wished !== undefined && (await portIsFree(wished))) return wished
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.once('error', reject)
    probe.listen({ port: 0, host: '127.0.0.1' }, () => {
      const { port } = probe.address()
      probe.close(() => resolve(port))
    })
  })
}

/** Asks again and again until the answer is true; false once the time is over. */
export async function until(condition, { timeoutMs, everyMs = 100 }) {
  const end = Date.now() + timeoutMs
  while (Date.now() < end) {
    if (await condition()) return true
    await wait(everyMs)
  }
  return false
}

/** True while a process with this id exists. Says nothing about whether it is still the one that was started. */
export function processExists(pid) {
  try {
    process.kill(pid, 0)
    return true
  } catch (error) {
    return error.code === 'EPERM'
  }
}
