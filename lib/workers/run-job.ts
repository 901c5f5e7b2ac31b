import 'server-only'
import { setInterval } from 'node:timers'
import { claim, fail, finish, giveBack, heartbeat, JOB_KINDS, LEASE_MS } from '@/lib/domain/jobs/queue'
import { isSteadfoldError } from '@/lib/errors'
import type { Job } from '@/models'
import { assessJob } from './assess-job'
import type { Assessor } from './assessor'
import { releaseJob } from './release-job'

export interface Shift {
  /** This worker's name, unique among those alive. */
  worker: string
  assessor: Assessor
  clock: () => Date
  /** Aborted when the process is asked to end: the job in hand is given back for the next worker. */
  signal?: AbortSignal
}

/** Takes the next job that is due and does it. False: nothing was due. */
export async function runNextJob(shift: Shift): Promise<boolean> {
  const { worker, clock, signal } = shift
  const job = await claim(worker, JOB_KINDS, clock())
  if (job === null) return false
  const beat = setInterval(() => {
    void heartbeat(job.id, worker, null, clock()).catch(() => undefined)
  }, LEASE_MS / 4)
  try {
    const done = perform(job, shift)
    // Not done by the time we must go: it runs again from the start elsewhere, and is recorded once.
    const left = await Promise.race([done.then(() => false), aborted(signal)])
    if (left) await giveBack(job.id, worker, clock())
    else await finish(job.id, worker)
  } catch (error) {
    const known = isSteadfoldError(error)
    await fail(job, worker, { message: wordsOf(error), final: known, forPeople: known }, clock())
  } finally {
    clearInterval(beat)
  }
  return true
}

function perform(job: Job, { assessor, clock }: Shift): Promise<void> {
  switch (job.kind) {
    case 'assess':
      return assessJob(job.payload, assessor, clock)
    case 'release':
      return releaseJob(job.payload, clock)
    default:
      throw new Error(`Nobody knows how to do a job of kind “${job.kind}”.`)
  }
}

function aborted(signal: AbortSignal | undefined): Promise<true> {
  return new Promise((resolve) => {
    if (signal?.aborted) resolve(true)
    signal?.addEventListener('abort', () => resolve(true), { once: true })
  })
}

function wordsOf(error: unknown): string {
  return error instanceof Error ? error.message : String(error)
}
