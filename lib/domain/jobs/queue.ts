import 'server-only'
import { literal, Op } from 'sequelize'
import type { Transaction } from 'sequelize'
import { isDuplicate, transaction } from '@/lib/db/transaction'
import { models } from '@/models'
import type { Job } from '@/models'
import type { JobProgress } from '@/models/job'

export const JOB_KINDS = ['assess', 'release'] as const
export type JobKind = (typeof JOB_KINDS)[number]

/** How long a worker may be silent before another takes its job. */
export const LEASE_MS = 60_000
export const MAX_ATTEMPTS = 5

export interface NewJob {
  kind: JobKind
  payload: Record<string, unknown>
  /** At most one unfinished job holds a key; a second with the same key changes nothing. */
  dedupeKey: string
  runAfter: Date
}

/** Puts work in the queue, in the transaction that decided it. */
export async function enqueue(tx: Transaction, job: NewJob): Promise<void> {
  try {
    await models.Job.create(
      { ...job, leaseUntil: null, leasedBy: null, lastError: null, progress: null },
      { transaction: tx },
    )
  } catch (error) {
    if (!isDuplicate(error)) throw error
  }
}

/** Takes the job that has been due longest, or one whose worker has gone silent; null where there is none. */
export function claim(worker: string, kinds: readonly JobKind[], now: Date): Promise<Job | null> {
  return transaction(async (tx) => {
    const due = { state: 'queued', runAfter: { [Op.lte]: now } }
    const abandoned = { state: 'running', leaseUntil: { [Op.lt]: now } }
    const job = await models.Job.findOne({
      where: { kind: [...kinds], [Op.or]: [due, abandoned] },
      order: [
        ['runAfter', 'ASC'],
        ['id', 'ASC'],
      ],
      lock: tx.LOCK.UPDATE,
      skipLocked: true,
      transaction: tx,
    })
    if (job === null) return null
    const leaseUntil = new Date(now.getTime() + LEASE_MS)
    return job.update(
      { state: 'running', attempts: job.attempts + 1, leasedBy: worker, leaseUntil },
      { transaction: tx },
    )
  })
}

/** Says that the worker is alive and how far it is. False: the job is no longer this worker's, stop. */
export async function heartbeat(
  jobId: number,
  worker: string,
  progress: JobProgress | null,
  now: Date,
): Promise<boolean> {
  const leaseUntil = new Date(now.getTime() + LEASE_MS)
  const [count] = await models.Job.update(
    { leaseUntil, ...(progress === null ? {} : { progress }) },
    { where: { id: jobId, state: 'running', leasedBy: worker } },
  )
  return count === 1
}

/** Puts a job back untouched because its worker must go: it is due at once, and the attempt does not count. */
export async function giveBack(jobId: number, worker: string, now: Date): Promise<void> {
  await models.Job.update(
    { state: 'queued', runAfter: now, leaseUntil: null, leasedBy: null, attempts: literal('attempts - 1') },
    { where: { id: jobId, state: 'running', leasedBy: worker } },
  )
}

/** Ends a job that is done. False: another worker had taken it over. */
export async function finish(jobId: number, worker: string): Promise<boolean> {
  return end(jobId, worker, { state: 'done', lastError: null })
}

/**
 * Ends an attempt that failed: again later (after 10 s, 40 s, 160 s, …), or for good after the last attempt or where
 * trying again cannot help. Says which.
 */
export async function fail(
  job: Pick<Job, 'id' | 'attempts'>,
  worker: string,
  error: { message: string; final: boolean },
  now: Date,
): Promise<'again' | 'failed' | 'lost'> {
  const lastError = error.message.slice(0, 2000)
  if (error.final || job.attempts >= MAX_ATTEMPTS) {
    return (await end(job.id, worker, { state: 'failed', lastError })) ? 'failed' : 'lost'
  }
  const runAfter = new Date(now.getTime() + 10_000 * 4 ** (job.attempts - 1))
  const [count] = await models.Job.update(
    { state: 'queued', runAfter, leaseUntil: null, leasedBy: null, lastError },
    { where: { id: job.id, state: 'running', leasedBy: worker } },
  )
  return count === 1 ? 'again' : 'lost'
}

async function end(
  jobId: number,
  worker: string,
  values: { state: 'done' | 'failed'; lastError: string | null },
): Promise<boolean> {
  const [count] = await models.Job.update(
    { ...values, leaseUntil: null, leasedBy: null, dedupeKey: null },
    { where: { id: jobId, state: 'running', leasedBy: worker } },
  )
  return count === 1
}
