import { setTimeout as wait } from 'node:timers/promises'

const IDLE_MS = 400
const TROUBLED_MS = 3_000

/**
 * Works until told to stop: at once again while there is work, a moment later where there is none, and a longer moment
 * after trouble (a database that restarts, say), which is written to standard error.
 */
export async function workLoop(
  name: string,
  stop: AbortSignal,
  workOnce: () => Promise<boolean>,
): Promise<void> {
  while (!stop.aborted) {
    let pauseMs = 0
    try {
      if (!(await workOnce())) pauseMs = IDLE_MS
    } catch (error) {
      process.stderr.write(
        `${name}: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`,
      )
      pauseMs = TROUBLED_MS
    }
    if (pauseMs > 0) await wait(pauseMs, undefined, { signal: stop }).catch(() => undefined)
  }
}
