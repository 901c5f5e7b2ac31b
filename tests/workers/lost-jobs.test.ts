import { beforeEach, describe, expect, it } from 'vitest'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { withdrawApproval } from '@/lib/domain/approvals/withdraw'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { consignmentStatus } from '@/lib/domain/consignments/load'
import { submitConsignment } from '@/lib/domain/consignments/submit'
import { claim, LEASE_MS, MAX_ATTEMPTS } from '@/lib/domain/jobs/queue'
import { releaseConsignment } from '@/lib/domain/release/release'
import { SteadfoldError } from '@/lib/errors'
import type { Assessor } from '@/lib/workers/assessor'
import { runNextJob } from '@/lib/workers/run-job'
import { models } from '@/models'
import { act, approved, later, NOW, saved, signature, world, type World } from '../domain/world'
import { emptyTables } from '../support/db'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

/** A worker whose engine does not survive, as when a thread has used up its memory. */
function failing(error: Error): Assessor & { tries: number } {
  return {
    tries: 0,
    async assess() {
      this.tries += 1
      throw error
    },
    async close() {},
  }
}

async function asked() {
  const { consignmentId } = await saved(place, NOW)
  const ask = () => assessConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
  const { assessmentId } = await ask()
  return { consignmentId, assessmentId, ask }
}

const statusOf = (consignmentId: number) => consignmentStatus(place.as('dispatcher'), { consignmentId })

async function expectAskedAnew({ consignmentId, assessmentId, ask }: Awaited<ReturnType<typeof asked>>) {
  expect((await models.Consignment.findByPk(consignmentId))?.state).toBe('draft')
  const again = await ask()
  expect(again).toMatchObject({ status: 'queued' })
  expect(again.assessmentId).not.toBe(assessmentId)
  expect(await models.Job.count({ where: { state: 'queued' } })).toBe(1)
}

describe('an assessment whose job is lost', () => {
  it('has failed, in plain words, after the engine has broken off five times, and can be asked for again', async () => {
    const it = await asked()
    const assessor = failing(
      new Error('Worker terminated due to reaching memory limit: JS heap out of memory'),
    )
    let now = NOW
    const shift = { worker: 'w1', assessor, clock: () => now }
    for (let attempt = 1; attempt <= MAX_ATTEMPTS; attempt += 1) {
      expect((await statusOf(it.consignmentId)).assessment?.status).not.toBe('failed')
      expect(await runNextJob(shift)).toBe(true)
      now = new Date(now.getTime() + 3_600_000)
    }
    expect(assessor.tries).toBe(MAX_ATTEMPTS)
    expect(await runNextJob(shift)).toBe(false)
    const { assessment } = await statusOf(it.consignmentId)
    expect(assessment).toMatchObject({ status: 'failed' })
    expect(assessment?.error).toContain('broke off each time it was tried')
    expect(assessment?.error).not.toContain('heap')
    // What the machine said is for whoever looks after it.
    const line = await models.AuditEvent.findOne({ where: { verb: 'assessment.fail' } })
    expect(line?.note).toContain('JS heap out of memory')
    await expectAskedAnew(it)
  })

  it('has failed at once where the engine says that it cannot', async () => {
    const it = await asked()
    const assessor = failing(new SteadfoldError('unavailable', 'The catalogue cannot be read.'))
    await runNextJob({ worker: 'w1', assessor, clock: () => NOW })
    expect((await statusOf(it.consignmentId)).assessment).toMatchObject({
      status: 'failed',
      error: 'The catalogue cannot be read.',
    })
    await expectAskedAnew(it)
  })

  it('has failed once it has silenced a worker five times', async () => {
    const it = await asked()
    const now = await silenceWorkers('assess')
    expect((await statusOf(it.consignmentId)).assessment?.status).toBe('queued')
    expect(await claim('w6', ['assess'], now)).toBeNull()
    const { assessment } = await statusOf(it.consignmentId)
    expect(assessment).toMatchObject({ status: 'failed' })
    expect(assessment?.error).toContain('The worker stopped while doing this, 5 times over')
    await expectAskedAnew(it)
  })
})

describe('a release whose job is lost', () => {
  it('says so on the page until the crates are signed again or it is asked for again', async () => {
    const { consignmentId } = await approved(place, NOW)
    await release(consignmentId)
    expect(await statusOf(consignmentId)).toMatchObject({ releasing: true, releaseError: '' })
    const now = await silenceWorkers('release')
    expect(await claim('w6', ['release'], now)).toBeNull()
    expect(await statusOf(consignmentId)).toMatchObject({
      releasing: false,
      releaseError: expect.stringContaining('The worker stopped while doing this, 5 times over') as string,
    })
    await release(consignmentId)
    expect(await statusOf(consignmentId)).toMatchObject({ releasing: true, releaseError: '' })
  })

  it('is history once the same plan is signed anew', async () => {
    const { consignmentId } = await approved(place, NOW)
    await release(consignmentId)
    const now = await silenceWorkers('release')
    await claim('w6', ['release'], now)
    const one = await models.Approval.findOne({ where: { consignmentId }, rejectOnEmpty: true })
    const reason = 'Looked at the wrong crate.'
    await withdrawApproval(place.as('vet'), { ...act(), approvalId: one.id, reason }, later(10))
    const desk = place.as('dispatcher')
    await assessConsignment(desk, { ...act(), consignmentId }, later(12))
    await submitConsignment(desk, { ...act(), consignmentId }, later(14))
    const anew = await signature(place, consignmentId, { crateIds: [one.crateRef] })
    await approveCrates(place.as('vet'), anew, later(20))
    expect(await statusOf(consignmentId)).toMatchObject({
      row: { state: 'approved' },
      releasing: false,
      releaseError: '',
    })
  })

  it('is history once another plan is signed', async () => {
    const { consignmentId } = await approved(place, NOW)
    await release(consignmentId)
    await claim('w6', ['release'], await silenceWorkers('release'))
    // Another plan under signatures of the same minute: the job speaks of the one it was asked for.
    const planHash = 'f'.repeat(64)
    await models.Consignment.update({ planHash }, { where: { id: consignmentId } })
    expect(await statusOf(consignmentId)).toMatchObject({ row: { state: 'approved' }, releaseError: '' })
  })

  const release = (consignmentId: number) =>
    releaseConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
})

/** Five workers in a row take the job and are not heard of again. Resolves with when the last one's lease has run out. */
async function silenceWorkers(kind: 'assess' | 'release'): Promise<Date> {
  let now = NOW
  for (let attempt = 1; attempt <= MAX_ATTEMPTS; attempt += 1) {
    expect(await claim(`w${attempt}`, [kind], now)).toMatchObject({ kind, attempts: attempt })
    now = new Date(now.getTime() + LEASE_MS + 1)
  }
  return now
}
