import 'server-only'
import { literal, Op } from 'sequelize'
import type { Transaction } from 'sequelize'
import { isDuplicate, transaction } from '@/lib/db/transaction'
import { models } from '@/models'
import type { Job } from '@/models'
import type { JobProgress } from '@/models/job'
import { tellOfLostJob } from './lost-job'

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

/**
 * Takes the job that has been due longest, or one whose worker has gone silent; null where there is none. A job that has
 * silenced a worker at each of its attempts is not handed on: it ends as failed.
 */
export function claim(worker: string, kinds: readonly JobKind[], now: Date): Promise<Job | null> {
  return transaction(async (tx) => {
    for (;;) {
      const job = await nextDue(tx, kinds, now)
      if (job === null) return null
      if (job.attempts < MAX_ATTEMPTS) return take(tx, job, worker, now)
      await endForGood(tx, job, { message: SILENCED, forPeople: true }, now)
    }
  })
}

const SILENCED = `The worker stopped while doing this, ${MAX_ATTEMPTS} times over, so it is not tried again by itself. Ask for it again; if it stops once more, tell whoever looks after this installation.`

function nextDue(tx: Transaction, kinds: readonly JobKind[], now: Date): Promise<Job | null> {
  const due = { state: 'queued', runAfter: { [Op.lte]: now } }
  const abandoned = { state: 'running', leaseUntil: { [Op.lt]: now } }
  return models.Job.findOne({
    where: { kind: [...kinds], [Op.or]: [due, abandoned] },
    order: [
      ['runAfter', 'ASC'],
      ['id', 'ASC'],
    ],
    lock: tx.LOCK.UPDATE,
    skipLocked: true,
    transaction: tx,
  })
}

function take(tx: Transaction, job: Job, worker: string, now: Date): Promise<Job> {
  const leaseUntil = new Date(now.getTime() + LEASE_MS)
  return job.update(
    { state: 'running', attempts: job.attempts + 1, leasedBy: worker, leaseUntil },
    { transaction: tx },
  )
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
  const [count] = await models.Job.update(
    { state: 'done', lastError: null, ...ENDED },
    { where: { id: jobId, state: 'running', leasedBy: worker } },
  )
  return count === 1
}

export interface Failure {
  message: string
  /** Trying again cannot help. */
  final: boolean
  /** The message was written for the people who use this, not by a library. */
  forPeople: boolean
}

/**
 * Ends an attempt that failed: again later (after 10 s, 40 s, 160 s, …), or for good after the last attempt or where
 * trying again cannot help; what the job was to do is then marked as failed in the same transaction. Says which.
 */
export function fail(
  { id, attempts }: Pick<Job, 'id' | 'attempts'>,
  worker: string,
  failure: Failure,
  now: Date,
): Promise<'again' | 'failed' | 'lost'> {
  return transaction(async (tx) => {
    const job = await models.Job.findOne({
      where: { id, state: 'running', leasedBy: worker },
      lock: tx.LOCK.UPDATE,
      transaction: tx,
    })
    if (job === null) return 'lost'
    if (failure.final || attempts >= MAX_ATTEMPTS) {
      await endForGood(tx, job, failure, now)
      return 'failed'
    }
    const runAfter = new Date(now.getTime() + 10_000 * 4 ** (attempts - 1))
    const lastError = clipped(failure.message)
    await job.update(
      { state: 'queued', runAfter, leaseUntil: null, leasedBy: null, lastError },
      { transaction: tx },
    )
    return 'again'
  })
}

const ENDED = { leaseUntil: null, leasedBy: null, dedupeKey: null }

async function endForGood(
  tx: Transaction,
  job: Job,
  failure: Pick<Failure, 'message' | 'forPeople'>,
  now: Date,
): Promise<void> {
  await job.update({ state: 'failed', lastError: clipped(failure.message), ...ENDED }, { transaction: tx })
  await tellOfLostJob(tx, job, failure, now)
}

function clipped(message: string): string {
  return message.slice(0, 2000)
}
