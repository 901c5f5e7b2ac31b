import { beforeEach, describe, expect, it } from 'vitest'
import { transaction } from '@/lib/db/transaction'
import { LEASE_MS, MAX_ATTEMPTS, claim, enqueue, fail, finish, heartbeat } from '@/lib/domain/jobs/queue'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import { NOW, later } from './clock'

beforeEach(emptyTables)

const put = (dedupeKey: string, runAfter = NOW) =>
  transaction((tx) => enqueue(tx, { kind: 'assess', payload: { assessmentId: 1 }, dedupeKey, runAfter }))
const take = (worker: string, now = NOW) => claim(worker, ['assess', 'release'], now)

describe('the queue', () => {
  it('holds one unfinished job for a key, and another once that is done', async () => {
    await put('assess:1')
    await put('assess:1')
    expect(await models.Job.count()).toBe(1)
    const job = await take('w1')
    expect(await finish(job?.id ?? 0, 'w1')).toBe(true)
    await put('assess:1')
    expect(await models.Job.count({ where: { state: 'queued' } })).toBe(1)
  })

  it('gives two workers at the same moment two different jobs', async () => {
    await put('a')
    await put('b')
    const jobs = await Promise.all([take('w1'), take('w2')])
    expect(new Set(jobs.map((job) => job?.id)).size).toBe(2)
    expect(jobs.every((job) => job !== null)).toBe(true)
    expect(await take('w3')).toBeNull()
  })

  it('waits until a job is due', async () => {
    await put('later', later(5))
    expect(await take('w1', later(4))).toBeNull()
    expect(await take('w1', later(5))).not.toBeNull()
  })

  it('hands the job of a silent worker on, and the silent one may not end it any more', async () => {
    await put('a')
    const job = await take('w1')
    const id = job?.id ?? 0
    expect(await take('w2', new Date(NOW.getTime() + LEASE_MS))).toBeNull()
    expect(await heartbeat(id, 'w1', { stage: 'Runs', done: 1, total: 9 }, later(1))).toBe(true)
    expect(await take('w2', new Date(later(1).getTime() + LEASE_MS))).toBeNull()
    expect(await take('w2', new Date(later(1).getTime() + LEASE_MS + 1))).toMatchObject({ id, attempts: 2 })
    expect(await heartbeat(id, 'w1', null, later(3))).toBe(false)
    expect(await finish(id, 'w1')).toBe(false)
    expect(await finish(id, 'w2')).toBe(true)
  })

  it('tries again later and later, and gives up', async () => {
    await put('a')
    const waits: number[] = []
    let now = NOW
    for (let attempt = 1; attempt <= MAX_ATTEMPTS; attempt += 1) {
      const job = await take('w1', now)
      if (job === null) throw new Error('The job is not due.')
      const became = await fail(job, 'w1', { message: 'No answer.', final: false, forPeople: false }, now)
      expect(became).toBe(attempt === MAX_ATTEMPTS ? 'failed' : 'again')
      const row = await models.Job.findByPk(job.id, { rejectOnEmpty: true })
      waits.push((row.runAfter.getTime() - now.getTime()) / 1000)
      now = row.runAfter
    }
    expect(waits.slice(0, 4)).toEqual([10, 40, 160, 640])
    expect(await models.Job.findOne()).toMatchObject({
      state: 'failed',
      lastError: 'No answer.',
      dedupeKey: null,
    })
  })

  it('gives up at once where another try cannot help', async () => {
    await put('a')
    const job = await take('w1')
    if (job === null) throw new Error('The job is not due.')
    expect(await fail(job, 'w1', { message: 'Bad plan.', final: true, forPeople: true }, NOW)).toBe('failed')
  })

  it('hands a job that silences every worker on until its attempts are used up, and then ends it', async () => {
    await put('deadly')
    await put('after')
    let now = NOW
    for (let attempt = 1; attempt <= MAX_ATTEMPTS; attempt += 1) {
      expect(await take(`w${attempt}`, now)).toMatchObject({ dedupeKey: 'deadly', attempts: attempt })
      now = new Date(now.getTime() + LEASE_MS + 1)
    }
    // In the same breath the next one gets its turn.
    expect(await take('w6', now)).toMatchObject({ dedupeKey: 'after', attempts: 1 })
    expect(await models.Job.findOne({ where: { state: 'failed' } })).toMatchObject({
      attempts: MAX_ATTEMPTS,
      dedupeKey: null,
      leasedBy: null,
      lastError: expect.stringContaining('The worker stopped while doing this, 5 times over') as string,
    })
    expect(await take('w7', later(60))).toMatchObject({ dedupeKey: 'after', attempts: 2 })
  })
})
