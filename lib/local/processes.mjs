import { spawn } from 'node:child_process'
import { readFileSync, rmSync, writeFileSync } from 'node:fs'
import { setTimeout as wait } from 'node:timers/promises'
import { processExists, until } from './run.mjs'

const LONGEST_PAUSE_MS = 30_000
/** Lived this long: its next fall is a new one, not one more of the same. */
const SOUND_MS = 60_000

/**
 * Keeps one process alive: started again after 1, 2, 4 … 30 s when it ends by itself. `falls` counts ends in a row.
 * Each child leads its own process group, so that Ctrl-C reaches us alone and we end them in order.
 */
export class Supervised {
  #child
  #stopping = false
  #falls = 0
  #note

  /**
   * @param {{
   *   name: string, command: string, args: string[], cwd: string, env: Record<string, string | undefined>,
   *   say: (name: string, text: string) => unknown, onFall?: (falls: number, reason: string) => unknown,
   *   note?: { add: (pid: number) => unknown, remove: (pid: number) => unknown },
   * }} options
   */
  constructor({ name, command, args, cwd, env, say, onFall = () => undefined, note }) {
    Object.assign(this, { name, command, args, cwd, env, say, onFall })
    this.#note = note
    this.#start()
  }

  get pid() {
    return this.#child?.pid
  }

  #start() {
    const began = Date.now()
    const child = spawn(this.command, this.args, {
      cwd: this.cwd,
      env: this.env,
      detached: true,
      stdio: ['ignore', 'pipe', 'pipe'],
    })
    this.#child = child
    this.#note?.add(child.pid)
    child.stdout.setEncoding('utf8').on('data', (text) => this.say(this.name, text))
    child.stderr.setEncoding('utf8').on('data', (text) => this.say(this.name, text))
    child.on('error', (error) => this.say(this.name, `${error.message}\n`))
    child.on('close', (code, signal) => {
      this.#note?.remove(child.pid)
      if (!this.#stopping) this.#again(began, signal ?? `exit code ${code}`)
    })
  }

  async #again(began, reason) {
    this.#falls = Date.now() - began > SOUND_MS ? 1 : this.#falls + 1
    this.onFall(this.#falls, reason)
    const pauseMs = Math.min(1000 * 2 ** (this.#falls - 1), LONGEST_PAUSE_MS)
    this.say(this.name, `ended (${reason}); starts again in ${pauseMs / 1000} s\n`)
    await wait(pauseMs, undefined, { ref: false })
    if (!this.#stopping) this.#start()
  }

  /** Ends the process as it stands; it is started again at once. */
  restart() {
    this.#falls = 0
    if (this.#child && running(this.#child)) signalGroup(this.#child.pid, 'SIGTERM')
  }

  /** Asks it to end, and after the grace period makes it. */
  async stop(graceMs = 15_000) {
    this.#stopping = true
    const child = this.#child
    if (!child || !running(child)) return
    signalGroup(child.pid, 'SIGTERM')
    if (await until(() => !running(child), { timeoutMs: graceMs, everyMs: 50 })) return
    signalGroup(child.pid, 'SIGKILL')
    await until(() => !running(child), { timeoutMs: 5_000, everyMs: 50 })
  }
}

/**
 * Notes the processes that run, so that the next start can end those left over by a kill that could not be caught.
 * A number alone proves nothing, as the system uses it again: the process must carry our mark, NAME=value.
 */
export function processNote(file, ourMark) {
  const pids = new Set()
  const save = () => writeFileSync(file, JSON.stringify([...pids]))
  return {
    add: (pid) => (pids.add(pid), save()),
    remove: (pid) => (pids.delete(pid), save()),
    async endLeftovers() {
      for (const pid of readPids(file)) {
        if (!isOurs(pid, ourMark)) continue
        signalGroup(pid, 'SIGTERM')
        if (!(await until(() => !processExists(pid), { timeoutMs: 8_000 }))) signalGroup(pid, 'SIGKILL')
      }
      rmSync(file, { force: true })
    },
  }
}

function readPids(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8')).filter(Number.isInteger)
  } catch {
    return []
  }
}

/** By a variable that only our processes are given; next renames its process, so the command line would not tell. */
function isOurs(pid, mark) {
  try {
    return readFileSync(`/proc/${pid}/environ`, 'utf8').split('\0').includes(mark)
  } catch {
    return false
  }
}

function running(child) {
  return child.exitCode === null && child.signalCode === null
}

function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal)
  } catch {
    // Already gone.
  }
}
